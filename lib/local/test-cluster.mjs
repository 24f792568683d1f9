import { rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { takeLock } from "./lock.mjs";
import { ensureCluster, findPostmaster, stopCluster } from "./postgres-cluster.mjs";
import { choosePlace } from "./postgres-place.mjs";
import { Refusal } from "./refusal.mjs";
import { ensureSecrets } from "./secrets.mjs";
import { databaseUrl, dropDatabase, ensureAppRole, runSql } from "./sql.mjs";
import { ensureTemplate } from "./template.mjs";

// Tests throw their databases away, so nothing is gained by waiting for the disk.
const SETTINGS = ["fsync=off", "synchronous_commit=off", "full_page_writes=off", "max_connections=200"];

/** @param {string} root */
const testFolder = (root) => join(root, ".data", "test");
/** @param {string} root */
const urlFile = (root) => join(testFolder(root), "database-url");

/**
 * The cluster of the tests, running, with a template migrated as the tree stands now.
 * Its administrator's URL goes to .data/test/database-url, where tests/support/database.ts looks for it.
 * @param {string} root
 */
export async function raiseTestCluster(root) {
  const release = takeLock(join(testFolder(root), "database.lock"), { waitSeconds: 120 });
  if (!release)
    throw new Refusal(
      "Another process has been starting the test database for two minutes; look at .data/test.",
    );
  try {
    // One password for both roles: test code makes databases as the one and works in them as the other.
    const { databaseAdminPassword: password } = ensureSecrets(join(testFolder(root), "secrets.json"));
    const cluster = await ensureCluster({
      folder: join(testFolder(root), "postgres"),
      password,
      portsFile: join(testFolder(root), "ports.json"),
      logFile: join(testFolder(root), "logs", "database.log"),
      settings: SETTINGS,
    });
    if (cluster.startedHere) await dropLeftovers(cluster);
    await ensureAppRole(cluster, password);
    await ensureTemplate(root, cluster, password);
    const url = databaseUrl(cluster.port, "postgres", password, "postgres");
    writeFileSync(urlFile(root), `${url}\n`, { mode: 0o600 });
    return { cluster, url, password };
  } finally {
    release();
  }
}

/**
 * Databases of test files that were killed. Only over a server just started: nobody can be using them yet.
 * @param {import("./postgres-cluster.mjs").Cluster} cluster
 */
async function dropLeftovers(cluster) {
  const names = await runSql(cluster, "SELECT datname FROM pg_database WHERE starts_with(datname, 'test_')");
  for (const name of names.split("\n").filter(Boolean)) await dropDatabase(cluster, name);
}

/** @param {string} root @returns {Promise<boolean>} whether it was running */
export async function lowerTestCluster(root) {
  rmSync(urlFile(root), { force: true });
  const running = findPostmaster(choosePlace(join(testFolder(root), "postgres")).folder);
  return running ? stopCluster(running.mark) : false;
}
