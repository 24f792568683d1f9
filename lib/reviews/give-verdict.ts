import { sql } from "drizzle-orm";
import type { z } from "zod";
import type { Transaction } from "@/db/client";
import { verdicts } from "@/db/schema/reviews";
import { authorize } from "../auth/authorize";
import type { Ctx } from "../context";
import { DomainError } from "../errors";
import { recordEvent } from "../events/record";
import { findVersion, holdShot, type FoundVersion } from "./find-version";
import { refuseSuperseded } from "./refuse-superseded";
import { giveVerdictSchema, type GiveVerdict } from "./schema";
import { composeDeclaration, frameWords } from "./schema-declaration";
import { tellStopped } from "./tell-stopped";
import { tellVerdict } from "./tell-verdict";

/** The advisor's word on frames of a digest. It follows any earlier one, and alters none. */
export async function giveVerdict(ctx: Ctx, input: z.infer<typeof giveVerdictSchema>) {
  const { productionId, shotId } = await findVersion(ctx.db, input.version);
  authorize(ctx.actor, "verdict.give", productionId);
  return ctx.db.transaction(async (tx) => {
    const newest = await holdShot(tx, shotId);
    const version = await findVersion(tx, input.version);
    const digest = refuseUnjudgeable(ctx, version, newest);
    refuseInput(version, digest, input);
    await refuseSuperseded(tx, version.id, input.after);

    const { kind, first, last, words } = input;
    const said = { advisor: ctx.actor.name, maker: version.maker, digest, kind, first, last, words };
    const { production, shotCode, number } = version;
    const statement = composeDeclaration({ ...said, production, shotCode, number });
    const [given] = await tx
      .insert(verdicts)
      .values({
        versionId: version.id,
        digest,
        kind,
        first,
        last,
        words,
        statement,
        givenBy: ctx.actor.id,
        givenAs: "advisor",
        // The moment it is given, not when its transaction began: a later verdict must be later.
        givenAt: sql`clock_timestamp()`,
      })
      .returning();
    await record(tx, ctx, version, input);
    await tellVerdict(tx, ctx.actor, version, { id: given!.id, kind, first, last, words });
    if (kind === "returned") await tellStopped(tx, version, { id: given!.id, kind, first, last, words });
    return { verdict: given!.id, statement, givenAt: given!.givenAt.toISOString() };
  });
}

function refuseUnjudgeable(ctx: Ctx, version: FoundVersion, newest: number): string {
  const name = `version ${version.number} of ${version.shotCode}`;
  if (version.madeBy === ctx.actor.id)
    throw new DomainError("forbidden", `You made ${name} yourself: another advisor must give its verdict.`);
  if (version.digest === null || version.sentAt === null)
    throw new DomainError(
      "conflict",
      `Nobody has sent ${name} for review, so there is nothing to judge yet.`,
    );
  if (version.number !== newest)
    throw new DomainError(
      "conflict",
      `Version ${newest} of ${version.shotCode} has been made since, and governs. No verdict was given on version ${version.number}.`,
    );
  return version.digest;
}

function refuseInput(version: FoundVersion, digest: string, { figures, first, last }: GiveVerdict): void {
  if (figures !== digest.slice(-8))
    throw new DomainError(
      "invalid",
      "These are not the last eight figures of this version's digest. Compare them with the digest beside the form.",
      "figures",
    );
  const has = `Version ${version.number} has frames ${version.first} to ${version.last}.`;
  if (first < version.first || first > version.last) throw new DomainError("invalid", has, "first");
  if (last > version.last) throw new DomainError("invalid", has, "last");
}

async function record(tx: Transaction, ctx: Ctx, version: FoundVersion, input: GiveVerdict): Promise<void> {
  await recordEvent(tx, {
    productionId: version.productionId,
    actorId: ctx.actor.id,
    kind: input.kind === "signed off" ? "verdict.signed" : "verdict.returned",
    subject: {
      by: ctx.actor.name,
      version: version.number,
      shot: version.shotCode,
      frames: frameWords(input.first, input.last),
      words: input.words,
      digest: version.digest ?? "",
      versionId: version.id,
      shotId: version.shotId,
    },
  });
}
