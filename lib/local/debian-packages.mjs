import { accessSync, constants, existsSync, mkdirSync, readdirSync, writeFileSync } from "node:fs";
import { delimiter, dirname, join } from "node:path";
import { listProgramFolders } from "./postgres-programs.mjs";
import { step } from "./progress.mjs";
import { Refusal } from "./refusal.mjs";
import { mustRun, runTask } from "./task.mjs";

const CLUSTER_CONFIG = "/etc/postgresql-common/createcluster.conf";
const PACKAGE_LISTS = "/var/lib/apt/lists";

/** What each package is needed for, as a look at the thing itself: it may have come another way. */
const present = {
  postgresql: () => listProgramFolders().length > 0,
  chromium: () => existsSync("/usr/bin/chromium"),
  openexr: () => isOnPath("exrheader"),
  unzip: () => isOnPath("unzip"),
};

/** @typedef {keyof typeof present} PackageName */

/**
 * Installs what is missing as root; otherwise says exactly what to type and stops.
 * @param {import("./task.mjs").TaskContext} context
 * @param {PackageName[]} names
 * @param {string} logFile
 */
export async function ensureDebianPackages(context, names, logFile) {
  const missing = names.filter((name) => !present[name]());
  if (missing.length === 0) return;
  const install = ["apt-get", "install", "-y", "--no-install-recommends", ...missing];
  if (process.getuid?.() !== 0 || !isOnPath("apt-get")) {
    throw new Refusal(
      `Missing from this machine: ${missing.join(", ")}. Type this, then the command again:\n` +
        `  sudo apt-get update && sudo ${install.join(" ")}`,
    );
  }
  if (missing.includes("postgresql")) preventMainCluster();
  await step(
    `Installed from Debian: ${missing.join(", ")}`,
    () => installPackages(context, install, logFile),
    `Installing from Debian: ${missing.join(", ")}.`,
  );
}

/**
 * @param {import("./task.mjs").TaskContext} context
 * @param {string[]} install
 * @param {string} logFile
 */
async function installPackages(context, install, logFile) {
  const env = { ...process.env, DEBIAN_FRONTEND: "noninteractive" };
  const apt = { ...context, env };
  const listed =
    existsSync(PACKAGE_LISTS) && readdirSync(PACKAGE_LISTS).some((name) => name.includes("_Packages"));
  if (listed && (await runTask(apt, install, logFile)) === 0) return;
  await mustRun(apt, ["apt-get", "update"], "apt-get update failed", logFile);
  await mustRun(apt, install, "apt-get could not install the packages", logFile);
}

/** Debian's package would make and start a cluster of its own on port 5432, which nobody asked for. */
function preventMainCluster() {
  if (existsSync(CLUSTER_CONFIG)) return;
  mkdirSync(dirname(CLUSTER_CONFIG), { recursive: true });
  writeFileSync(CLUSTER_CONFIG, "create_main_cluster = false\n");
}

/** @param {string} program */
function isOnPath(program) {
  return (process.env.PATH ?? "").split(delimiter).some((folder) => {
    try {
      accessSync(join(folder, program), constants.X_OK);
      return true;
    } catch {
      return false;
    }
  });
}
