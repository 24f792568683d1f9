import { and, eq } from "drizzle-orm";
import type { z } from "zod";
import type { Transaction } from "@/db/client";
import { productions, sequences } from "@/db/schema/productions";
import { setups, shots } from "@/db/schema/shots";
import { authorize } from "../auth/authorize";
import type { Ctx } from "../context";
import { DomainError, found } from "../errors";
import { recordEvent } from "../events/record";
import { firstSetup } from "../setups/first-setup";
import { requireArtist } from "./require-artist";
import type { createShotInput, CreateShotInput } from "./schema";

/** Adds a shot with a first setup to work from. */
export async function createShot(ctx: Ctx, input: z.infer<typeof createShotInput>): Promise<{ id: string }> {
  authorize(ctx.actor, "shot.create", input.production);
  return ctx.db.transaction(async (tx) => {
    const [row] = await tx.select().from(productions).where(eq(productions.id, input.production));
    const production = found(row, "production");
    await requireSequence(tx, input);
    if (input.artist) await requireArtist(tx, input.production, input.artist);
    const [shot] = await tx
      .insert(shots)
      .values({
        productionId: input.production,
        sequenceId: input.sequence,
        code: input.code,
        brief: input.brief,
        dueOn: input.dueOn,
        artistId: input.artist,
      })
      .onConflictDoNothing()
      .returning({ id: shots.id });
    if (!shot)
      throw new DomainError(
        "conflict",
        `There is already a shot ${input.code} in ${production.name}.`,
        "code",
      );

    await tx
      .insert(setups)
      .values({ shotId: shot.id, body: firstSetup(production.kind), savedBy: ctx.actor.id });
    await recordEvent(tx, {
      productionId: input.production,
      actorId: ctx.actor.id,
      kind: "shot.made",
      subject: { by: ctx.actor.name, shotId: shot.id, shot: input.code },
    });
    return shot;
  });
}

async function requireSequence(tx: Transaction, { production, sequence }: CreateShotInput): Promise<void> {
  const [row] = await tx
    .select()
    .from(sequences)
    .where(and(eq(sequences.id, sequence), eq(sequences.productionId, production)));
  if (!row) throw new DomainError("invalid", "Choose a sequence of this production.", "sequence");
}
