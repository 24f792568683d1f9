import { and, eq, sql } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import { people } from "@/db/schema/people";
import { renders } from "@/db/schema/versions";
import { recordEvent } from "../events/record";
import { queueMail } from "../queue/outbox";
import { nameVersion, type NamedVersion } from "../versions/name-version";

export interface RenderFailure {
  versionId: string;
  attempt: number;
  frame: number;
  /** A whole sentence: what happened, and what to do. */
  why: string;
}

/** Stops a render, keeping what is finished, and says which frame and why: once, however many of its jobs fail. */
export async function failRender(
  db: Database,
  { versionId, attempt, frame, why }: RenderFailure,
): Promise<void> {
  await db.transaction(async (tx) => {
    const stopped = await tx
      .update(renders)
      .set({
        state: "failed",
        failedFrame: frame,
        failure: why,
        changedAt: sql`now()`,
        finishedAt: sql`now()`,
      })
      .where(
        and(eq(renders.versionId, versionId), eq(renders.attempt, attempt), eq(renders.state, "rendering")),
      )
      .returning({ id: renders.versionId });
    if (stopped.length === 0) return;

    const version = await nameVersion(tx, versionId);
    await recordEvent(tx, {
      productionId: version.productionId,
      actorId: null,
      kind: "version.failed",
      subject: { versionId, shotId: version.shotId, version: version.number, shot: version.shot, frame, why },
    });
    await tellMaker(tx, version, attempt, frame, why);
  });
}

async function tellMaker(
  tx: Transaction,
  { id, shot, number, madeBy }: NamedVersion,
  attempt: number,
  frame: number,
  why: string,
): Promise<void> {
  const [maker] = await tx.select().from(people).where(eq(people.id, madeBy));
  if (!maker || maker.leftAt) return;
  await queueMail(tx, `version.failed ${id} ${attempt}`, {
    to: maker.email,
    subject: `Version ${number} of ${shot} stopped at frame ${frame}`,
    paragraphs: [why, "The frames that were finished are kept. Resume the version when the cause is gone."],
    action: { label: `Open version ${number} of ${shot}`, path: `/versions/${id}` },
  });
}
