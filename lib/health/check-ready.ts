// Whether this process can do its work now, part by part, in words that tell an outsider nothing more.
import { randomUUID } from "node:crypto";
import { mkdir, readFile, rm, writeFile } from "node:fs/promises";
import { join } from "node:path";
import { sql } from "drizzle-orm";
import Redis from "ioredis";
import type { Database } from "@/db/client";
import { environment } from "../environment";
import { log } from "../log";
import { storage } from "../storage/storage";

export interface PartReady {
  part: "database" | "migrations" | "storage" | "queue";
  ready: boolean;
  words: string;
}

const patience = 3000;

export async function checkReady(db: Database): Promise<PartReady[]> {
  return Promise.all([
    check("database", "The database answers.", "The database does not answer.", async () => {
      await db.execute(sql`select 1`);
    }),
    check(
      "migrations",
      "The database has this build's tables.",
      "The database lacks this build's tables: migrate it.",
      () => checkMigrations(db),
    ),
    check("storage", "Files can be kept.", "Files cannot be kept.", checkStorage),
    check("queue", "The queue answers.", "The queue does not answer.", () => checkQueue(db)),
  ]);
}

async function check(
  part: PartReady["part"],
  good: string,
  bad: string,
  work: () => Promise<void>,
): Promise<PartReady> {
  let timer: NodeJS.Timeout | undefined;
  try {
    const late = new Promise<never>((_resolve, reject) => {
      timer = setTimeout(() => reject(new Error(`no answer within ${patience} ms`)), patience);
    });
    await Promise.race([work(), late]);
    return { part, ready: true, words: good };
  } catch (error) {
    log.warn({ err: error, part }, "not ready");
    return { part, ready: false, words: bad };
  } finally {
    clearTimeout(timer);
  }
}

async function checkMigrations(db: Database): Promise<void> {
  const path = join(process.cwd(), "drizzle", "meta", "_journal.json");
  const journal = JSON.parse(await readFile(path, "utf8")) as { entries: { when: number }[] };
  const done = await db.execute<{ last: string }>(
    sql`select max(created_at) as last from drizzle.__drizzle_migrations`,
  );
  const last = Number(done.rows[0]?.last ?? 0);
  const missing = journal.entries.filter(({ when }) => when > last).length;
  if (missing > 0) throw new Error(`${missing} migrations are missing`);
}

async function checkStorage(): Promise<void> {
  const { S3_BUCKET, STORAGE_DIR } = environment();
  if (S3_BUCKET) {
    await storage().size("0".repeat(64));
    return;
  }
  await mkdir(STORAGE_DIR, { recursive: true });
  const probe = join(STORAGE_DIR, `.ready-${randomUUID()}`);
  await writeFile(probe, "");
  await rm(probe);
}

async function checkQueue(db: Database): Promise<void> {
  const { REDIS_URL } = environment();
  if (!REDIS_URL) {
    await db.execute(sql`select 1 from bullmq.job limit 1`);
    return;
  }
  const redis = new Redis(REDIS_URL, {
    lazyConnect: true,
    connectTimeout: patience,
    retryStrategy: () => null,
  });
  try {
    await redis.connect();
    await redis.ping();
  } finally {
    redis.disconnect();
  }
}
