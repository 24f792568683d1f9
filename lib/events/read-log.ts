import { and, count, desc, eq, lt, sql } from "drizzle-orm";
import type { z } from "zod";
import type { Database } from "@/db/client";
import { events } from "@/db/schema/events";
import type { Ctx } from "../context";
import { found } from "../errors";
import { authorizeLog, listLogs } from "./choose-log";
import type { readLogInput } from "./schema";
import { sentenceOf } from "./sentence";

const pageLength = 100;

/** A page of a log, newest first, and whether its chain of hashes holds from the first line to the last. */
export async function readLog(ctx: Ctx, { production: chain, before }: z.infer<typeof readLogInput>) {
  authorizeLog(ctx, chain);
  const logs = await listLogs(ctx);
  const here = and(eq(events.chain, chain), before ? lt(events.seq, before) : undefined);
  const rows = await ctx.db.select().from(events).where(here).orderBy(desc(events.seq)).limit(pageLength);
  const last = rows.at(-1);
  return {
    chain,
    logs,
    name: found(
      logs.find(({ id }) => id === chain),
      "log",
    ).name,
    timeZone: ctx.actor.timeZone,
    ...(await checkChain(ctx.db, chain)),
    lines: rows.map(({ seq, at, kind, subject, hash }) => ({
      seq,
      at: at.toISOString(),
      sentence: sentenceOf(kind, subject),
      hash,
    })),
    older: last && last.seq > 1 ? last.seq : null,
  };
}

/** The database recomputes every hash: how many lines there are, and the first that does not follow from the one before. */
export async function checkChain(
  db: Database,
  chain: string,
): Promise<{ total: number; brokenAt: number | null }> {
  const [row] = await db.select({ total: count() }).from(events).where(eq(events.chain, chain));
  const broken = await db.execute<{ seq: string | null }>(sql`select broken_event(${chain}) as seq`);
  const seq = broken.rows[0]?.seq ?? null;
  return { total: row?.total ?? 0, brokenAt: seq === null ? null : Number(seq) };
}
