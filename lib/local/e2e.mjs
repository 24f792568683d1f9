import { rmSync } from "node:fs";
import { join, relative } from "node:path";
import { ensureWebBuild } from "./build.mjs";
import { makeDemonstration } from "./demonstration.mjs";
import { assembleEnvironment } from "./environment.mjs";
import { root } from "./folders.mjs";
import { findPortFrom, keepPort } from "./ports.mjs";
import { step } from "./progress.mjs";
import { APP_ROLE, databaseUrl, dropDatabase, runSql } from "./sql.mjs";
import { raiseStudio } from "./studio.mjs";
import { runTask } from "./task.mjs";
import { TEMPLATE } from "./template.mjs";
import { countPlaywright, readTotals } from "./totals.mjs";

const DATABASE = "ringwright_e2e";
const FIRST_PORT = 3100;

/**
 * @typedef {object} E2eContext
 * @property {import("./task.mjs").TaskContext} task
 * @property {import("./folders.mjs").Folders} folders
 * @property {ReturnType<typeof import("./shutdown.mjs").prepareShutdown>} shutdown
 * @property {import("./postgres-cluster.mjs").Cluster} cluster
 * @property {string} password
 * @property {string} adminUrl
 */

/**
 * The browser tests, against the production build with a worker, a mail server, a database and folders of its own.
 * @param {E2eContext} context
 */
export async function runE2e({ task, folders, shutdown, cluster, password, adminUrl }) {
  const distDir = relative(root, join(folders.data, "next"));
  await ensureWebBuild(task, distDir, join(folders.logs, "build.log"));
  await dropDatabase(cluster, DATABASE);
  await runSql(cluster, `CREATE DATABASE ${DATABASE} TEMPLATE ${TEMPLATE} OWNER ${APP_ROLE}`);
  for (const path of [folders.storage, folders.mail, folders.accounts])
    rmSync(path, { recursive: true, force: true });
  const env = assembleEnvironment({
    base: process.env,
    folders,
    databaseUrl: databaseUrl(cluster.port, APP_ROLE, password, DATABASE),
    secret: password,
    webPort: await findPortFrom(FIRST_PORT),
    smtpPort: await keepPort(folders.ports, "mail"),
    distDir,
  });
  await step("The studio is in place", () => makeDemonstration({ ...task, env }));
  const { signal, onStop, end } = shutdown;
  const url = await step("Web, worker and mail server are running", () =>
    raiseStudio({ root, folders, env, signal, onStop, giveUp: end }),
  );
  const report = join(folders.data, "playwright.json");
  rmSync(report, { force: true });
  // The pids let a test end the worker as a crash would.
  const told = {
    E2E_BASE_URL: url,
    E2E_REPORT: report,
    E2E_PIDS_FILE: folders.pids,
    TEST_DATABASE_URL: adminUrl,
  };
  const command = [process.execPath, "node_modules/@playwright/test/cli.js", "test"];
  return readTotals(report, await runTask({ ...task, env: { ...env, ...told } }, command), countPlaywright);
}
