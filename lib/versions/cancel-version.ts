import { and, eq, sql } from "drizzle-orm";
import type { z } from "zod";
import { renders } from "@/db/schema/versions";
import type { Ctx } from "../context";
import { DomainError } from "../errors";
import { recordEvent } from "../events/record";
import { findVersion } from "./find-version";
import { nameVersion } from "./name-version";
import type { versionIdInput } from "./schema";

/** Stops a render, mid-frame; what is finished is kept, and the version can be resumed. */
export async function cancelVersion(ctx: Ctx, input: z.infer<typeof versionIdInput>): Promise<void> {
  const { id, productionId } = await findVersion(ctx.db, ctx.actor, "version.cancel", input.version);
  await ctx.db.transaction(async (tx) => {
    const stopped = await tx
      .update(renders)
      .set({ state: "cancelled", changedAt: sql`now()`, finishedAt: sql`now()` })
      .where(and(eq(renders.versionId, id), eq(renders.state, "rendering")))
      .returning({ id: renders.versionId });
    if (stopped.length === 0)
      throw new DomainError(
        "conflict",
        "This version is not being rendered now, so there is nothing to cancel.",
      );
    const { shot, shotId, number } = await nameVersion(tx, id);
    await recordEvent(tx, {
      productionId,
      actorId: ctx.actor.id,
      kind: "version.cancelled",
      subject: { by: ctx.actor.name, versionId: id, shotId, version: number, shot },
    });
  });
}
