import { mkdtempSync } from "node:fs";
import { rm } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { sql } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { GET as health } from "@/app/api/health/route";
import { GET as ready } from "@/app/api/ready/route";
import { database } from "@/lib/database";
import { freshDatabase, type TestDatabase } from "../support/database";
import { prepareEnvironment } from "../support/links";

const folder = mkdtempSync(join(tmpdir(), "ringwright-health-"));
let test: TestDatabase;
beforeAll(async () => {
  test = await freshDatabase();
  prepareEnvironment(test.url);
  process.env.STORAGE_DIR = folder;
});
afterAll(async () => {
  await database().$client.end();
  await test.drop();
  await rm(folder, { recursive: true });
});

describe("the routes a supervisor asks", () => {
  it("say that the process is alive", async () => {
    expect(await health().json()).toEqual({ alive: true, words: "The process is alive." });
  });

  it("say 200 when it can do its work and 503, naming the part, when it cannot", async () => {
    const good = await ready();
    expect([good.status, ((await good.json()) as { words: string }).words]).toEqual([200, "Ready."]);
    await database().execute(sql`alter schema bullmq rename to elsewhere`);
    const bad = await ready();
    expect(bad.status).toBe(503);
    expect(await bad.json()).toMatchObject({ ready: false, words: "The queue does not answer." });
  });
});
