import { join } from "node:path";
import { forgetPid, recordPid } from "./pids.mjs";
import { ensureCluster, stopCluster } from "./postgres-cluster.mjs";
import { step } from "./progress.mjs";
import { APP_ROLE, databaseUrl, dropDatabase, ensureAppRole, ensureDatabase } from "./sql.mjs";

const DATABASE = "ringwright";

/**
 * The installation's own database, running.
 * @param {import("./folders.mjs").Folders} folders
 * @param {import("./secrets.mjs").Secrets} secrets
 * @param {(stop: () => Promise<unknown>) => void} onStop
 */
export async function raiseLocalDatabase(folders, secrets, onStop) {
  const cluster = await step("PostgreSQL is running", () =>
    ensureCluster({
      folder: folders.postgres,
      password: secrets.databaseAdminPassword,
      portsFile: folders.ports,
      logFile: join(folders.logs, "database.log"),
    }),
  );
  if (cluster.note) console.log(cluster.note);
  recordPid(folders.pids, "database", cluster.mark.pid);
  onStop(async () => {
    await stopCluster(cluster.mark);
    forgetPid(folders.pids, "database");
  });
  await ensureAppRole(cluster, secrets.databasePassword);
  await ensureDatabase(cluster, DATABASE);
  return { cluster, url: databaseUrl(cluster.port, APP_ROLE, secrets.databasePassword, DATABASE) };
}

/** @param {import("./postgres-cluster.mjs").Cluster} cluster */
export async function emptyLocalDatabase(cluster) {
  await dropDatabase(cluster, DATABASE);
  await ensureDatabase(cluster, DATABASE);
}
