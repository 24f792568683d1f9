import { rmSync } from "node:fs";
import { join } from "node:path";
import { ensureSky } from "./build.mjs";
import { ensureDebianPackages } from "./debian-packages.mjs";
import { runE2e } from "./e2e.mjs";
import { root } from "./folders.mjs";
import { ensureNpmPackages } from "./npm-packages.mjs";
import { forgetPid, recordPid } from "./pids.mjs";
import { stopCluster } from "./postgres-cluster.mjs";
import { step } from "./progress.mjs";
import { runTask } from "./task.mjs";
import { raiseTestCluster } from "./test-cluster.mjs";
import { countVitest, readTotals } from "./totals.mjs";
import { runVerify } from "./verify-steps.mjs";

/** @typedef {import("./task.mjs").TaskContext} TaskContext */
/** @typedef {ReturnType<typeof import("./shutdown.mjs").prepareShutdown>} Shutdown */

const PROJECTS = {
  all: ["render", "lib", "components", "db", "app"],
  unit: ["render", "lib", "components"],
  db: ["db", "app"],
  e2e: [],
};

/**
 * @param {"all" | "unit" | "db" | "e2e"} only
 * @param {import("./folders.mjs").Folders} folders
 * @param {Shutdown} shutdown
 * @param {(part: import("./totals.mjs").Totals) => void} count told each part's totals as it ends
 */
export async function runTests(only, folders, shutdown, count) {
  const task = { cwd: root, pidsFile: folders.pids, signal: shutdown.signal };
  await ensureNpmPackages(task, join(folders.logs, "npm.log"));
  await ensureDebianPackages(
    task,
    ["postgresql", "chromium", "openexr", "unzip"],
    join(folders.logs, "apt.log"),
  );
  if (only === "all") count(await runVerify(shutdown.signal));
  const { cluster, url, password } = await raiseCluster(folders, shutdown);
  await ensureSky(task, join(folders.logs, "sky.log"));
  if (PROJECTS[only].length > 0) count(await runVitest(task, folders, PROJECTS[only], url));
  if (only === "all" || only === "e2e")
    count(await runE2e({ task, folders, shutdown, cluster, password, adminUrl: url }));
}

/** A cluster that was already up (test-database.mjs) is left up. @param {import("./folders.mjs").Folders} folders @param {Shutdown} shutdown */
async function raiseCluster(folders, shutdown) {
  const raised = await step("The test database is running and migrated", () => raiseTestCluster(root));
  const { mark, startedHere } = raised.cluster;
  if (startedHere) {
    recordPid(folders.pids, "database", mark.pid);
    shutdown.onStop(async () => {
      await stopCluster(mark);
      forgetPid(folders.pids, "database");
    });
  }
  return raised;
}

/**
 * @param {TaskContext} task
 * @param {import("./folders.mjs").Folders} folders
 * @param {string[]} projects
 * @param {string} adminUrl
 */
async function runVitest(task, folders, projects, adminUrl) {
  const report = join(folders.data, "vitest.json");
  rmSync(report, { force: true });
  const chosen = projects.flatMap((project) => ["--project", project]);
  const reporters = ["--reporter=default", "--reporter=json", `--outputFile.json=${report}`];
  // A database named from outside is somebody's own: tests must not find it.
  const env = { ...process.env, DATABASE_URL: undefined, TEST_DATABASE_URL: adminUrl };
  const code = await runTask({ ...task, env }, [
    process.execPath,
    "node_modules/vitest/vitest.mjs",
    "run",
    "--allowOnly=false",
    ...chosen,
    ...reporters,
  ]);
  return readTotals(report, code, countVitest);
}
