import type { z } from "zod";
import type { Transaction } from "@/db/client";
import { submissions } from "@/db/schema/reviews";
import { authorize } from "../auth/authorize";
import type { Ctx } from "../context";
import { DomainError } from "../errors";
import { recordEvent } from "../events/record";
import { queueMail } from "../queue/outbox";
import { findMembers } from "./find-members";
import { findVersion, holdShot, type FoundVersion } from "./find-version";
import { sendForReviewSchema } from "./schema";
import { frameWords } from "./schema-declaration";

/** Sends a whole version to the production's advisors, once. */
export async function sendForReview(ctx: Ctx, input: z.infer<typeof sendForReviewSchema>) {
  const { productionId, shotId } = await findVersion(ctx.db, input.version);
  authorize(ctx.actor, "review.send", productionId);
  return ctx.db.transaction(async (tx) => {
    const newest = await holdShot(tx, shotId);
    const version = await findVersion(tx, input.version);
    const digest = refuseUnready(version, newest);
    const [sent] = await tx
      .insert(submissions)
      .values({ versionId: version.id, digest, words: input.words, sentBy: ctx.actor.id })
      .onConflictDoNothing()
      .returning();
    if (!sent)
      throw new DomainError(
        "conflict",
        `Version ${version.number} of ${version.shotCode} has already been sent for review.`,
      );
    await recordEvent(tx, {
      productionId,
      actorId: ctx.actor.id,
      kind: "review.sent",
      subject: {
        by: ctx.actor.name,
        version: version.number,
        shot: version.shotCode,
        versionId: version.id,
        shotId: version.shotId,
      },
    });
    await askAdvisors(tx, ctx, version, input.words);
    return { version: version.id, sentAt: sent.sentAt.toISOString() };
  });
}

function refuseUnready(version: FoundVersion, newest: number): string {
  const name = `version ${version.number} of ${version.shotCode}`;
  if (version.digest === null)
    throw new DomainError("conflict", `The frames of ${name} are not all rendered. Send it once they are.`);
  if (version.number !== newest)
    throw new DomainError(
      "conflict",
      `Version ${newest} of ${version.shotCode} is newer and governs: send that one.`,
    );
  return version.digest;
}

async function askAdvisors(tx: Transaction, ctx: Ctx, version: FoundVersion, words: string): Promise<void> {
  const advisors = await findMembers(tx, version.productionId, ["advisor"]);
  const due = version.dueOn ? ` The shot is due on ${version.dueOn}.` : "";
  for (const advisor of advisors)
    await queueMail(tx, `review.sent ${version.id} ${advisor.id}`, {
      to: advisor.email,
      subject: `Version ${version.number} of ${version.shotCode} waits for your verdict`,
      paragraphs: [
        `${ctx.actor.name} sent version ${version.number} of ${version.shotCode}, ${frameWords(version.first, version.last)}, for your verdict.${due}`,
        `“${words}”`,
        `Its digest is ${version.digest}.`,
      ],
      action: { label: `Open version ${version.number}`, path: `/versions/${version.id}` },
    });
}
