// From the outbox to the queue, once what caused the job is committed. A row may be handed over twice when a process dies
// between handing over and marking it; its key is the job's id, so the queue holds it once.
import { and, asc, eq, isNull, lte, sql } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import { outbox } from "@/db/schema/events";
import { makeBell } from "../events/bell";
import { listenForChanges } from "../events/listen";
import { log } from "../log";
import { frameJobSchema } from "../renders/schema";
import type { FrameQueue } from "./frame-queue";

const batch = 100;
const longestWaitSeconds = 300;

/** Hands over what is due; returns how many rows it took up. Several relays may run at once. */
export async function relayJobs(db: Database, queue: Pick<FrameQueue, "add">): Promise<number> {
  return db.transaction(async (tx) => {
    const due = await tx
      .select()
      .from(outbox)
      .where(and(eq(outbox.kind, "job"), isNull(outbox.doneAt), lte(outbox.dueAt, sql`now()`)))
      .orderBy(asc(outbox.createdAt), asc(outbox.key))
      .limit(batch)
      .for("update", { skipLocked: true });
    for (const row of due) await relayOne(tx, queue, row);
    return due.length;
  });
}

async function relayOne(
  tx: Transaction,
  queue: Pick<FrameQueue, "add">,
  row: typeof outbox.$inferSelect,
): Promise<void> {
  const attempts = row.attempts + 1;
  try {
    await queue.add(row.key, frameJobSchema.parse(row.payload));
    await tx
      .update(outbox)
      .set({ attempts, doneAt: sql`now()`, lastError: null })
      .where(eq(outbox.id, row.id));
  } catch (error) {
    log.warn(
      { err: error, key: row.key, attempts },
      "the queue did not take a job; it will be offered again",
    );
    const seconds = Math.min(longestWaitSeconds, 2 ** Math.min(attempts, 9));
    await tx
      .update(outbox)
      .set({
        attempts,
        lastError: error instanceof Error ? error.message : String(error),
        dueAt: sql`now() + make_interval(secs => ${seconds})`,
      })
      .where(eq(outbox.id, row.id));
  }
}

/** Relays until the signal ends it: at once when something was committed, and every second in any case. */
export async function startJobRelay(
  db: Database,
  url: string,
  queue: Pick<FrameQueue, "add">,
  signal: AbortSignal,
): Promise<void> {
  const bell = makeBell();
  signal.addEventListener("abort", bell.ring, { once: true });
  const listening = listenForChanges(url, { onChange: bell.ring, onConnect: bell.ring }, signal);
  while (!signal.aborted) {
    const taken = await relayJobs(db, queue).catch((error: unknown) => {
      log.warn({ err: error }, "the outbox could not be read; trying again");
      return 0;
    });
    if (taken < batch) await bell.wait(1000);
  }
  await listening;
}
