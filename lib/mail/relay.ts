// From the outbox to the mail server, once what caused the letter is committed. A process that dies between sending and
// marking sends the letter again, under the same Message-ID.
import { and, asc, eq, isNull, lte, sql } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import { outbox } from "@/db/schema/events";
import { environment } from "../environment";
import { makeBell } from "../events/bell";
import { listenForChanges } from "../events/listen";
import { log } from "../log";
import { backOffSeconds } from "./back-off";
import { mailPayloadSchema } from "./schema";
import { openPost, type Post } from "./send";
import { writeLetter } from "./write-letter";

type Row = typeof outbox.$inferSelect;

/** Sends what is due, a letter a transaction; returns how many it took up. Several relays may run at once. */
export async function sendDueMail(db: Database, post: Post | null, studioUrl: string): Promise<number> {
  let taken = 0;
  while (await db.transaction((tx) => sendNext(tx, post, studioUrl))) taken += 1;
  return taken;
}

async function sendNext(tx: Transaction, post: Post | null, studioUrl: string): Promise<boolean> {
  const [row] = await tx
    .select()
    .from(outbox)
    .where(and(eq(outbox.kind, "mail"), isNull(outbox.doneAt), lte(outbox.dueAt, sql`clock_timestamp()`)))
    .orderBy(asc(outbox.dueAt), asc(outbox.key))
    .limit(1)
    .for("update", { skipLocked: true });
  if (!row) return false;
  const attempts = row.attempts + 1;
  try {
    await sendRow(row, post, studioUrl);
    await tx
      .update(outbox)
      .set({ attempts, doneAt: sql`clock_timestamp()`, lastError: null })
      .where(eq(outbox.id, row.id));
  } catch (error) {
    await putOff(tx, row, attempts, error);
  }
  return true;
}

async function sendRow(row: Row, post: Post | null, studioUrl: string): Promise<void> {
  if (!post) throw new Error("SMTP_URL is not set, so no mail can be sent.");
  await post.send(await writeLetter(row.key, mailPayloadSchema.parse(row.payload), studioUrl));
}

async function putOff(tx: Transaction, row: Row, attempts: number, error: unknown): Promise<void> {
  const seconds = backOffSeconds(attempts);
  log.warn({ err: error, key: row.key, attempts, seconds }, "a letter was not sent; it will be tried again");
  await tx
    .update(outbox)
    .set({
      attempts,
      lastError: error instanceof Error ? error.message : String(error),
      dueAt: sql`clock_timestamp() + make_interval(secs => ${seconds})`,
    })
    .where(eq(outbox.id, row.id));
}

/** Sends until the signal ends it: at once when something was committed, and every two seconds in any case. */
export async function startMailRelay(db: Database, signal: AbortSignal): Promise<void> {
  const { SMTP_URL, MAIL_FROM, NEXTAUTH_URL, DATABASE_URL } = environment();
  const post = SMTP_URL ? openPost(SMTP_URL, MAIL_FROM) : null;
  const bell = makeBell();
  signal.addEventListener("abort", bell.ring, { once: true });
  const listening = listenForChanges(DATABASE_URL, { onChange: bell.ring, onConnect: bell.ring }, signal);
  while (!signal.aborted) {
    await sendDueMail(db, post, NEXTAUTH_URL).catch((error: unknown) =>
      log.warn({ err: error }, "the outbox could not be read for mail; trying again"),
    );
    await bell.wait(2000);
  }
  await listening;
  post?.close();
}
