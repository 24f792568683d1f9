// What a change causes outside the database is written beside the change, in its transaction, and leaves afterwards.
import { outbox } from "@/db/schema/events";
import type { Transaction } from "@/db/client";
import type { MailPayload } from "../mail/schema";
import type { FrameJob } from "../renders/schema";

/** Queues one letter; `key` names its cause, so that it is sent once however often the cause is retried. */
export async function queueMail(tx: Transaction, key: string, payload: MailPayload): Promise<void> {
  await tx
    .insert(outbox)
    .values({ key: `mail ${key}`, kind: "mail", payload })
    .onConflictDoNothing({ target: outbox.key });
}

/** Queues jobs, each under a key that becomes the job's id, so that the queue holds it once. */
export async function queueJobs(tx: Transaction, jobs: { key: string; payload: FrameJob }[]): Promise<void> {
  const rows = jobs.map(({ key, payload }) => ({ key: `job ${key}`, kind: "job" as const, payload }));
  if (rows.length > 0) await tx.insert(outbox).values(rows).onConflictDoNothing({ target: outbox.key });
}
