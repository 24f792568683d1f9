import { readFileSync } from "node:fs";
import { join } from "node:path";
import { step } from "./progress.mjs";
import { mustRun } from "./task.mjs";

/** @typedef {Record<string, { version?: string, optional?: boolean }>} LockedPackages */

/**
 * Whether what is installed is what package-lock.json asks for, by npm's own record of its last whole installation
 * (node_modules/.package-lock.json): an interrupted one leaves no such record.
 * @param {LockedPackages} wanted
 * @param {LockedPackages | null} installed
 */
export function isInstalled(wanted, installed) {
  if (!installed) return false;
  return Object.entries(wanted).every(([path, entry]) => {
    if (path === "") return true;
    const found = installed[path];
    return found ? found.version === entry.version : entry.optional === true;
  });
}

/** @param {string} file @returns {LockedPackages | null} */
function readPackages(file) {
  try {
    return JSON.parse(readFileSync(file, "utf8")).packages;
  } catch {
    return null;
  }
}

/** @param {import("./task.mjs").TaskContext} context @param {string} logFile */
export async function ensureNpmPackages(context, logFile) {
  const wanted = readPackages(join(context.cwd, "package-lock.json")) ?? {};
  if (isInstalled(wanted, readPackages(join(context.cwd, "node_modules", ".package-lock.json")))) return;
  const command = ["npm", "ci", "--include=dev", "--no-audit", "--no-fund"];
  await step(
    "The npm packages are installed",
    () => mustRun(context, command, "npm ci could not install the packages", logFile),
    "Installing npm packages: a minute or two, once.",
  );
}
