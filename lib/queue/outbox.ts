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

/** Queues one job; the key becomes the job's id, so that the queue holds it once. */
export async function queueJob(tx: Transaction, key: string, payload: FrameJob): Promise<void> {
  await tx
    .insert(outbox)
    .values({ key: `job ${key}`, kind: "job", payload })
    .onConflictDoNothing({ target: outbox.key });
}
