import { runMigrations } from "bullmq";
import pg from "pg";

/** Makes or updates the job queue's own schema, which Drizzle does not know. */
export async function migrateQueue(url: string): Promise<void> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    await runMigrations(client);
  } finally {
    await client.end();
  }
}
