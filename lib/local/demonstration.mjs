import { existsSync, readFileSync, rmSync } from "node:fs";
import { emptyLocalDatabase } from "./local-database.mjs";
import { Refusal } from "./refusal.mjs";
import { mustRun } from "./task.mjs";

/** @typedef {{ role: string, name: string, email: string, password: string }} DemoAccount */

/**
 * Makes the demonstration studio when the database is empty; the maker itself looks.
 * @param {import("./task.mjs").TaskContext} context
 */
export const makeDemonstration = (context) =>
  mustRun(
    context,
    [process.execPath, "--import", "tsx", "lib/demo/make.ts"],
    "The demonstration could not be made",
  );

/**
 * Removes everything the local installation holds: database, files, mail and accounts.
 * @param {import("./folders.mjs").Folders} folders
 * @param {import("./postgres-cluster.mjs").Cluster | null} cluster null when the database is not ours
 */
export async function dropDemonstration(folders, cluster) {
  if (!cluster) {
    throw new Refusal(
      "--fresh-demo empties the database, and DATABASE_URL names one that Ringwright did not make. " +
        "Unset DATABASE_URL to use the local one.",
    );
  }
  await emptyLocalDatabase(cluster);
  for (const path of [folders.storage, folders.mail, folders.accounts])
    rmSync(path, { recursive: true, force: true });
  console.log(
    `Emptied the local database, ${folders.storage} and ${folders.mail}; the demonstration is made anew.`,
  );
}

/** @param {string} file @returns {DemoAccount[]} none when there is no demonstration here */
export const readAccounts = (file) => (existsSync(file) ? JSON.parse(readFileSync(file, "utf8")) : []);

/** @param {DemoAccount[]} accounts @returns {string[]} aligned lines */
export function formatAccounts(accounts) {
  const columns = accounts.map(({ role, name, email, password }) => [role, name, email, password]);
  const widths = [0, 1, 2].map((column) => Math.max(...columns.map((row) => row[column]?.length ?? 0)));
  return columns.map((row) => `  ${row.map((cell, column) => cell.padEnd(widths[column] ?? 0)).join("  ")}`);
}
