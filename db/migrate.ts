// Brings the database at DATABASE_URL up to date: our own tables first, then the job queue's.
import { join } from "node:path";
import { migrate } from "drizzle-orm/node-postgres/migrator";
import { openDatabase } from "./client";
import { migrateQueue } from "./migrate-queue";

const url = process.env.DATABASE_URL;
if (!url) {
  process.stderr.write("DATABASE_URL is not set: say which database to migrate.\n");
  process.exit(1);
}

const database = openDatabase(url, 1);
try {
  await migrate(database, { migrationsFolder: join(import.meta.dirname, "..", "drizzle") });
  await migrateQueue(url);
} finally {
  await database.$client.end();
}
