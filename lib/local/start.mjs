// npm start: from a fresh clone, or the last stop, to a studio one can sign in to. Only Node's own modules are imported
// here and in what is imported from here, because nothing may be installed yet.
import { mkdirSync } from "node:fs";
import { join } from "node:path";
import { ensureSky, ensureWebBuild } from "./build.mjs";
import { checkNode } from "./check-node.mjs";
import { ensureDebianPackages } from "./debian-packages.mjs";
import { dropDemonstration, formatAccounts, makeDemonstration, readAccounts } from "./demonstration.mjs";
import { assembleEnvironment } from "./environment.mjs";
import { foldersIn, root } from "./folders.mjs";
import { raiseLocalDatabase } from "./local-database.mjs";
import { takeLock } from "./lock.mjs";
import { ensureNpmPackages } from "./npm-packages.mjs";
import { parseStartOptions } from "./options.mjs";
import { reapLeftovers } from "./pids.mjs";
import { chooseWebPort, keepPort } from "./ports.mjs";
import { formatSeconds, step } from "./progress.mjs";
import { Refusal, runMain } from "./refusal.mjs";
import { ensureSecrets } from "./secrets.mjs";
import { prepareShutdown } from "./shutdown.mjs";
import { raiseStudio } from "./studio.mjs";
import { mustRun } from "./task.mjs";

/** @typedef {ReturnType<typeof prepareShutdown>} Shutdown */
/** @typedef {ReturnType<typeof parseStartOptions>} Options */

await runMain(async () => {
  checkNode();
  const options = parseStartOptions(process.argv.slice(2));
  const folders = foldersIn(options.data);
  mkdirSync(folders.logs, { recursive: true, mode: 0o711 });
  if (!takeLock(folders.lock)) {
    throw new Refusal(
      `Ringwright is already starting or running on ${folders.data}. Stop that one first, or use --data DIR.`,
    );
  }
  const shutdown = prepareShutdown();
  try {
    return await serve(options, folders, shutdown);
  } finally {
    await step("Everything is stopped", shutdown.stopAll);
  }
});

/** @param {Options} options @param {import("./folders.mjs").Folders} folders @param {Shutdown} shutdown */
async function serve(options, folders, shutdown) {
  const began = performance.now();
  const leftovers = await reapLeftovers(folders.pids);
  if (leftovers.length > 0)
    console.log(`Stopped what a killed start had left running: ${leftovers.join(", ")}.`);
  const task = { cwd: root, pidsFile: folders.pids, signal: shutdown.signal };
  await ensureNpmPackages(task, join(folders.logs, "npm.log"));
  // Before the data: the demonstration's frames show stars.
  await ensureSky(task, join(folders.logs, "sky.log"));
  const env = await prepareData(options, folders, shutdown, task);
  await ensureWebBuild(task, ".next", join(folders.logs, "build.log"));
  /** @type {Refusal | undefined} */
  let failure;
  const giveUp = (/** @type {Refusal} */ reason) => {
    failure = reason;
    shutdown.end();
  };
  const studio = { root, folders, env, signal: shutdown.signal, onStop: shutdown.onStop, giveUp };
  const url = await step("Web, worker and mail server are running", () => raiseStudio(studio));
  announce(url, folders, performance.now() - began);
  await shutdown.waitForSignal();
  if (failure) throw failure;
}

/**
 * Database, migrations and demonstration, and the environment that web and worker will have.
 * @param {Options} options
 * @param {import("./folders.mjs").Folders} folders
 * @param {Shutdown} shutdown
 * @param {import("./task.mjs").TaskContext} task
 */
async function prepareData(options, folders, shutdown, task) {
  const secrets = ensureSecrets(folders.secrets);
  const given = process.env.DATABASE_URL;
  if (!given) await ensureDebianPackages(task, ["postgresql"], join(folders.logs, "apt.log"));
  const local = given ? null : await raiseLocalDatabase(folders, secrets, shutdown.onStop);
  if (options.freshDemo) await dropDemonstration(folders, local?.cluster ?? null);
  const env = assembleEnvironment({
    base: process.env,
    folders,
    databaseUrl: given ?? local?.url ?? "",
    secret: secrets.nextauthSecret,
    webPort: await chooseWebPort(options.port),
    smtpPort: await keepPort(folders.ports, "mail"),
  });
  const migrate = [process.execPath, "--import", "tsx", join("db", "migrate.ts")];
  await step("The database is up to date", () =>
    mustRun(
      { ...task, env },
      migrate,
      "The database could not be migrated",
      join(folders.logs, "migrate.log"),
    ),
  );
  await step("The studio is in place", () => makeDemonstration({ ...task, env }));
  return env;
}

/** @param {string} url @param {import("./folders.mjs").Folders} folders @param {number} tookMs */
function announce(url, folders, tookMs) {
  const accounts = readAccounts(folders.accounts);
  const signIn = accounts.length > 0 ? ["Sign in as one of these:", "", ...formatAccounts(accounts), ""] : [];
  console.log(["", `Ringwright is ready after ${formatSeconds(tookMs)}: ${url}`, "", ...signIn].join("\n"));
  console.log("Ctrl-C stops it.");
}
