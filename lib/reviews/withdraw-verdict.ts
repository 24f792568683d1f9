import { sql } from "drizzle-orm";
import type { z } from "zod";
import type { Transaction } from "@/db/client";
import { verdicts } from "@/db/schema/reviews";
import { authorize } from "../auth/authorize";
import type { Ctx } from "../context";
import { DomainError } from "../errors";
import { recordEvent } from "../events/record";
import { findRuns } from "./find-verdicts";
import { findVersion, holdShot, type FoundVersion } from "./find-version";
import { refuseSuperseded } from "./refuse-superseded";
import { withdrawVerdictSchema } from "./schema";
import { composeWithdrawal } from "./schema-declaration";
import { tellStopped } from "./tell-stopped";
import { tellVerdict, type GivenVerdict } from "./tell-verdict";

/** Takes back the sign-off of every frame of a version that stands as signed off, whether or not the version is the newest. */
export async function withdrawVerdict(ctx: Ctx, input: z.infer<typeof withdrawVerdictSchema>) {
  const { productionId, shotId } = await findVersion(ctx.db, input.version);
  authorize(ctx.actor, "verdict.withdraw", productionId);
  return ctx.db.transaction(async (tx) => {
    await holdShot(tx, shotId);
    const version = await findVersion(tx, input.version);
    if (version.madeBy === ctx.actor.id)
      throw new DomainError(
        "forbidden",
        "You made this version yourself: another advisor must withdraw its verdict.",
      );
    await refuseSuperseded(tx, version.id, input.after);
    const signed = joinRuns((await findRuns(tx, version.id)).filter(({ kind }) => kind === "signed off"));
    if (signed.length === 0)
      throw new DomainError(
        "conflict",
        `No frame of version ${version.number} is signed off, so there is nothing to withdraw.`,
      );

    for (const { first, last } of signed) {
      const verdict = await insertWithdrawal(tx, ctx, version, { first, last, words: input.words });
      await tellVerdict(tx, ctx.actor, version, verdict);
      await tellStopped(tx, version, verdict);
    }
    await recordEvent(tx, {
      productionId,
      actorId: ctx.actor.id,
      kind: "verdict.withdrawn",
      subject: {
        by: ctx.actor.name,
        version: version.number,
        shot: version.shotCode,
        words: input.words,
        digest: version.digest ?? "",
        versionId: version.id,
        shotId,
      },
    });
    return { version: version.id, withdrawn: signed };
  });
}

/** Runs that touch, under different verdicts, are withdrawn as one. */
function joinRuns(runs: { first: number; last: number }[]): { first: number; last: number }[] {
  const joined: { first: number; last: number }[] = [];
  for (const { first, last } of runs) {
    const open = joined.at(-1);
    if (open && open.last === first - 1) open.last = last;
    else joined.push({ first, last });
  }
  return joined;
}

async function insertWithdrawal(
  tx: Transaction,
  ctx: Ctx,
  version: FoundVersion,
  said: { first: number; last: number; words: string },
): Promise<GivenVerdict> {
  const { production, shotCode, number } = version;
  const digest = version.digest!;
  const [given] = await tx
    .insert(verdicts)
    .values({
      versionId: version.id,
      digest,
      kind: "withdrawn",
      ...said,
      statement: composeWithdrawal({
        advisor: ctx.actor.name,
        production,
        shotCode,
        number,
        digest,
        ...said,
      }),
      givenBy: ctx.actor.id,
      givenAs: "advisor",
      givenAt: sql`clock_timestamp()`,
    })
    .returning({ id: verdicts.id });
  return { id: given!.id, kind: "withdrawn", ...said };
}
