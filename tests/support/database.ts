import { randomBytes } from "node:crypto";
import { readFileSync } from "node:fs";
import { join } from "node:path";
import pg from "pg";

export interface TestDatabase {
  /** Of a new, migrated, empty database, as the role the app itself works as. */
  url: string;
  drop: () => Promise<void>;
}

/** A database of this test file's own, copied from the migrated template. */
export async function freshDatabase(): Promise<TestDatabase> {
  const admin = new URL(findAdminUrl());
  const name = `test_${randomBytes(8).toString("hex")}`;
  await runAsAdmin(admin, `CREATE DATABASE ${name} TEMPLATE ringwright_template OWNER ringwright`);
  const url = new URL(admin);
  url.username = "ringwright";
  url.pathname = `/${name}`;
  return { url: url.href, drop: () => runAsAdmin(admin, `DROP DATABASE IF EXISTS ${name} WITH (FORCE)`) };
}

function findAdminUrl(): string {
  if (process.env.TEST_DATABASE_URL) return process.env.TEST_DATABASE_URL;
  try {
    return readFileSync(
      join(import.meta.dirname, "..", "..", ".data", "test", "database-url"),
      "utf8",
    ).trim();
  } catch {
    throw new Error("No test database is running. Start it: node lib/local/test-database.mjs up");
  }
}

async function runAsAdmin(admin: URL, statement: string): Promise<void> {
  const client = new pg.Client({ connectionString: admin.href });
  await client.connect();
  try {
    await client.query(statement);
  } finally {
    await client.end();
  }
}
