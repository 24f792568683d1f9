import { and, asc, eq, inArray, sql } from "drizzle-orm";
import type { z } from "zod";
import type { Transaction } from "@/db/client";
import { shots } from "@/db/schema/shots";
import { frames, renders } from "@/db/schema/versions";
import { kernelVersion } from "@/render/kernel-version";
import type { Ctx } from "../context";
import { DomainError } from "../errors";
import { recordEvent } from "../events/record";
import { queueFrames } from "../renders/queue-frames";
import { findVersion, type VersionRow } from "./find-version";
import { nameVersion } from "./name-version";
import type { versionIdInput } from "./schema";

/** Takes a stopped render up again: a new attempt, with jobs for the missing frames only. */
export async function resumeVersion(ctx: Ctx, input: z.infer<typeof versionIdInput>): Promise<void> {
  const version = await findVersion(ctx.db, ctx.actor, "version.resume", input.version);
  refuseOtherKernel(version);
  await ctx.db.transaction(async (tx) => {
    await refuseHeld(tx, version);
    const [render] = await tx
      .update(renders)
      .set({
        state: "rendering",
        attempt: sql`${renders.attempt} + 1`,
        failedFrame: null,
        failure: null,
        changedAt: sql`now()`,
        finishedAt: null,
      })
      .where(and(eq(renders.versionId, version.id), inArray(renders.state, ["failed", "cancelled"])))
      .returning({ attempt: renders.attempt });
    if (!render)
      throw new DomainError("conflict", "This version has not stopped, so there is nothing to resume.");

    await queueFrames(tx, version.id, render.attempt, await framesToDo(tx, version));
    const { shot, shotId, number, productionId } = await nameVersion(tx, version.id);
    await recordEvent(tx, {
      productionId,
      actorId: ctx.actor.id,
      kind: "version.resumed",
      subject: { by: ctx.actor.name, versionId: version.id, shotId, version: number, shot },
    });
  });
}

function refuseOtherKernel({ kernel }: VersionRow): void {
  if (kernel === kernelVersion) return;
  throw new DomainError(
    "conflict",
    `This version was begun with kernel ${kernel}; the studio now has ${kernelVersion}, which may give other pixels. ` +
      "One version holds the frames of one kernel: render a new version instead.",
  );
}

async function refuseHeld(tx: Transaction, { shotId }: VersionRow): Promise<void> {
  const [shot] = await tx.select().from(shots).where(eq(shots.id, shotId)).for("share");
  if (!shot || shot.hold === "none") return;
  const state = shot.hold === "on hold" ? "on hold" : "marked omitted";
  throw new DomainError(
    "conflict",
    `${shot.code} is ${state}, so nothing is rendered. A producer can take it up again.`,
  );
}

/** The frames without a row; when none is missing, the last, so that its job comes to the seal. */
async function framesToDo(tx: Transaction, { id, first, last }: VersionRow): Promise<number[]> {
  const kept = await tx
    .select({ number: frames.number })
    .from(frames)
    .where(eq(frames.versionId, id))
    .orderBy(asc(frames.number));
  const finished = new Set(kept.map(({ number }) => number));
  const missing: number[] = [];
  for (let number = first; number <= last; number += 1) if (!finished.has(number)) missing.push(number);
  return missing.length > 0 ? missing : [last];
}
