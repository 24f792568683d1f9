import { join } from "node:path";
import { runCommand } from "./processes.mjs";
import { APP_ROLE, databaseUrl, dropDatabase, quote, runSql } from "./sql.mjs";
import { stampOf } from "./stamps.mjs";

export const TEMPLATE = "ringwright_template";

/**
 * The migrated, empty database that every test file copies: made again only when a migration changed.
 * It is migrated under another name and then renamed, so that a copy is never taken half-way.
 * @param {string} root
 * @param {import("./postgres-cluster.mjs").Cluster} cluster
 * @param {string} password of the app's role
 */
export async function ensureTemplate(root, cluster, password) {
  const stamp = stampOf(root, ["drizzle", "db", "package-lock.json"]);
  const known = await runSql(
    cluster,
    `SELECT shobj_description(oid, 'pg_database') FROM pg_database WHERE datname = ${quote(TEMPLATE)}`,
  );
  if (known === stamp) return;
  const half = `${TEMPLATE}_unfinished`;
  await dropDatabase(cluster, half);
  await runSql(cluster, `CREATE DATABASE ${half} OWNER ${APP_ROLE}`);
  await migrate(root, databaseUrl(cluster.port, APP_ROLE, password, half));
  await dropDatabase(cluster, TEMPLATE);
  await runSql(cluster, `ALTER DATABASE ${half} RENAME TO ${TEMPLATE}`);
  await runSql(cluster, `COMMENT ON DATABASE ${TEMPLATE} IS ${quote(stamp)}`);
}

/**
 * @param {string} root
 * @param {string} url
 */
async function migrate(root, url) {
  const { code, output } = await runCommand({
    command: process.execPath,
    args: ["--import", "tsx", join("db", "migrate.ts")],
    options: { cwd: root, env: { ...process.env, DATABASE_URL: url } },
  });
  if (code !== 0) throw new Error(`The database could not be migrated:\n${output.trim()}`);
}
