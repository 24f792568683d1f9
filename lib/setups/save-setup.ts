import { and, eq, sql } from "drizzle-orm";
import type { z } from "zod";
import type { Transaction } from "@/db/client";
import { people } from "@/db/schema/people";
import { setups } from "@/db/schema/shots";
import { canonicalJson } from "@/render/scene/canonical";
import type { Ctx } from "../context";
import { DomainError, found } from "../errors";
import { announce } from "../events/record";
import { findShot } from "../shots/find-shot";
import type { saveSetupInput, SavedSetup } from "./schema";

/** Saves the setup, unless someone saved another since the revision this one was made on. */
export async function saveSetup(ctx: Ctx, input: z.infer<typeof saveSetupInput>): Promise<SavedSetup> {
  const shot = await findShot(ctx.db, ctx.actor, "setup.save", input.shot);
  return ctx.db.transaction(async (tx) => {
    const [saved] = await tx
      .update(setups)
      .set({
        body: input.setup,
        revision: sql`${setups.revision} + 1`,
        savedBy: ctx.actor.id,
        savedAt: sql`now()`,
      })
      .where(and(eq(setups.shotId, shot.id), eq(setups.revision, input.revision)))
      .returning();
    if (!saved) return explainStale(tx, ctx, input);
    const { productionId, id: shotId } = shot;
    await announce(tx, {
      kind: "setup.saved",
      productionId,
      shotId,
      revision: saved.revision,
      byId: ctx.actor.id,
    });
    return { revision: saved.revision, savedAt: saved.savedAt.toISOString() };
  });
}

async function explainStale(
  tx: Transaction,
  { actor }: Ctx,
  { shot, setup }: z.infer<typeof saveSetupInput>,
): Promise<SavedSetup> {
  const [row] = await tx
    .select({ setup: setups, name: people.name })
    .from(setups)
    .leftJoin(people, eq(people.id, setups.savedBy))
    .where(eq(setups.shotId, shot));
  const { setup: kept, name } = found(row, "setup");
  // The same words again, after an answer that was lost on its way: that change is saved.
  if (kept.savedBy === actor.id && canonicalJson(kept.body) === canonicalJson(setup))
    return { revision: kept.revision, savedAt: kept.savedAt.toISOString() };
  const at = kept.savedAt.toLocaleTimeString("en-GB", {
    timeZone: actor.timeZone,
    hour: "2-digit",
    minute: "2-digit",
  });
  const who = kept.savedBy === actor.id ? "You, in another window," : (name ?? "Someone else");
  throw new DomainError("conflict", `${who} saved this setup at ${at}; your change was not saved.`);
}
