// npm test: everything, on a database, ports, folders and a build of its own, so that npm start may be running beside.
import { mkdirSync } from "node:fs";
import { checkNode } from "./check-node.mjs";
import { foldersIn } from "./folders.mjs";
import { takeLock } from "./lock.mjs";
import { parseTestOptions } from "./options.mjs";
import { reapLeftovers } from "./pids.mjs";
import { Refusal, runMain } from "./refusal.mjs";
import { prepareShutdown } from "./shutdown.mjs";
import { runTests } from "./test-run.mjs";
import { addTotals, exitCodeOf, formatTotals } from "./totals.mjs";

await runMain(async () => {
  checkNode();
  const only = parseTestOptions(process.argv.slice(2));
  const folders = foldersIn(".data/test");
  mkdirSync(folders.logs, { recursive: true, mode: 0o711 });
  if (!takeLock(folders.lock))
    throw new Refusal("npm test is already running in this folder. Wait for it, or stop it.");
  await reapLeftovers(folders.pids);
  const shutdown = prepareShutdown();
  /** @type {import("./totals.mjs").Totals[]} */
  const parts = [];
  try {
    await runTests(only, folders, shutdown, (part) => parts.push(part));
  } catch (error) {
    // Whatever could not even be started has failed, and the totals say so.
    console.error(error instanceof Refusal ? error.message : error);
    parts.push({ passed: 0, failed: 1 });
  }
  await shutdown.stopAll();
  const totals = addTotals(parts);
  console.log(formatTotals(totals));
  return exitCodeOf(totals);
});
