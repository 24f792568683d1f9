import { mkdtempSync } from "node:fs";
import { readdir, rm } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { sql } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { openDatabase } from "@/db/client";
import { environment } from "@/lib/environment";
import { checkReady } from "@/lib/health/check-ready";
import { prepareEnvironment } from "../../support/links";
import { openStudio, type Studio } from "../../support/studio";

const folder = mkdtempSync(join(tmpdir(), "ringwright-ready-"));
let studio: Studio;
beforeAll(async () => {
  studio = await openStudio();
  prepareEnvironment(studio.url);
  process.env.STORAGE_DIR = folder;
});
afterAll(async () => {
  await studio.close();
  await rm(folder, { recursive: true });
});

const faults = async (db = studio.db) =>
  (await checkReady(db)).filter(({ ready }) => !ready).map(({ words }) => words);

describe("readiness", () => {
  it("is whole when database, tables, storage and queue are there, and leaves nothing behind", async () => {
    expect((await checkReady(studio.db)).map(({ part, ready }) => [part, ready])).toEqual([
      ["database", true],
      ["migrations", true],
      ["storage", true],
      ["queue", true],
    ]);
    expect(await readdir(folder)).toEqual([]);
  });

  it("says that files cannot be kept when the storage folder cannot be", async () => {
    environment().STORAGE_DIR = join("/dev/null", "storage");
    expect(await faults()).toEqual(["Files cannot be kept."]);
    environment().STORAGE_DIR = folder;
  });

  it("says that tables are missing, and that the queue does not answer, without them", async () => {
    await studio.db.execute(sql`update drizzle.__drizzle_migrations set created_at = created_at - 1`);
    await studio.db.execute(sql`alter schema bullmq rename to elsewhere`);
    expect(await faults()).toEqual([
      "The database lacks this build's tables: migrate it.",
      "The queue does not answer.",
    ]);
  });

  it("says that the database does not answer when it is gone", async () => {
    const gone = openDatabase("postgresql://nobody@127.0.0.1:1/none", 1);
    expect(await faults(gone)).toContain("The database does not answer.");
    await gone.$client.end();
  });
});
