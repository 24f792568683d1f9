// How often something may be tried. Counted in PostgreSQL, or in Redis when REDIS_URL is set.
import { createHash } from "node:crypto";
import Redis from "ioredis";
import { RateLimiterPostgres, RateLimiterRedis, RateLimiterRes } from "rate-limiter-flexible";
import type { Database } from "@/db/client";
import { environment } from "../environment";
import { DomainError } from "../errors";
import { log } from "../log";
import { wordsOfWait } from "./wait";

const minute = 60;
const hour = 60 * minute;

/** Tries allowed in a span of seconds, counted from the first. */
export const limits = {
  /** Passwords tried for one e-mail address from one machine. */
  "sign-in by address and machine": { points: 5, duration: 15 * minute },
  /** Passwords tried from one machine, for whatever addresses. */
  "sign-in by machine": { points: 50, duration: hour },
  /** Passwords tried for one e-mail address from anywhere: a machine can lie about where it is. */
  "sign-in by address": { points: 100, duration: hour },
  "reset asked by address": { points: 3, duration: hour },
  "reset asked by machine": { points: 20, duration: hour },
  "link tried by machine": { points: 30, duration: 15 * minute },
} as const;

export type Limit = keyof typeof limits;

type Limiter = RateLimiterPostgres | RateLimiterRedis;

const limitersOf = new WeakMap<object, Map<Limit, Limiter>>();
let redis: Redis | undefined;

/** Counts one try; throws "too-many", saying how long to wait, once there are none left. */
export async function countTry(db: Database, limit: Limit, subject: string): Promise<void> {
  try {
    await limiterOf(db, limit).consume(keyOf(subject));
  } catch (error) {
    if (!(error instanceof RateLimiterRes)) throw error;
    throw new DomainError(
      "too-many",
      `Too many tries. Wait ${wordsOfWait(error.msBeforeNext)}, then try again.`,
    );
  }
}

/** Takes one try back, because it was a right one. */
export async function giveTryBack(db: Database, limit: Limit, subject: string): Promise<void> {
  await limiterOf(db, limit).reward(keyOf(subject), 1);
}

/** Forgets every try of this subject. */
export async function forgetTries(db: Database, limit: Limit, subject: string): Promise<void> {
  await limiterOf(db, limit).delete(keyOf(subject));
}

// Hashed, so that the table holds nobody's address and a long one still fits.
const keyOf = (subject: string) => createHash("sha256").update(subject).digest("hex");

function limiterOf(db: Database, limit: Limit): Limiter {
  const known = limitersOf.get(db.$client) ?? new Map<Limit, Limiter>();
  limitersOf.set(db.$client, known);
  const limiter = known.get(limit) ?? makeLimiter(db, limit);
  known.set(limit, limiter);
  return limiter;
}

function makeLimiter(db: Database, limit: Limit): Limiter {
  const options = { ...limits[limit], keyPrefix: limit };
  const { REDIS_URL } = environment();
  if (REDIS_URL) return new RateLimiterRedis({ ...options, storeClient: (redis ??= openRedis(REDIS_URL)) });
  return new RateLimiterPostgres({
    ...options,
    storeClient: db.$client,
    storeType: "pool",
    tableName: "rate_limits",
    tableCreated: true,
  });
}

// A lost Redis refuses the try at once rather than let it wait, or let it through uncounted.
function openRedis(url: string): Redis {
  const client = new Redis(url, { maxRetriesPerRequest: 1 });
  client.on("error", (error) => log.warn({ err: error }, "the counts of tries cannot be reached"));
  return client;
}
