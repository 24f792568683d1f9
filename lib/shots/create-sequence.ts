import { eq, sql } from "drizzle-orm";
import type { z } from "zod";
import { productions, sequences } from "@/db/schema/productions";
import { authorize } from "../auth/authorize";
import type { Ctx } from "../context";
import { recordEvent } from "../events/record";
import type { createSequenceInput } from "./schema";

/** Adds a sequence after the production's last. */
export async function createSequence(
  ctx: Ctx,
  { production, name }: z.infer<typeof createSequenceInput>,
): Promise<{ id: string; number: number }> {
  authorize(ctx.actor, "shot.create", production);
  return ctx.db.transaction(async (tx) => {
    // Two people adding at once get two numbers.
    await tx.select().from(productions).where(eq(productions.id, production)).for("update");
    const number = sql<number>`(select coalesce(max(s.number), 0) + 1 from sequences s where s.production_id = ${production})`;
    const [made] = await tx
      .insert(sequences)
      .values({ productionId: production, name, number })
      .returning({ id: sequences.id, number: sequences.number });
    await recordEvent(tx, {
      productionId: production,
      actorId: ctx.actor.id,
      kind: "sequence.made",
      subject: { by: ctx.actor.name, sequenceId: made!.id, sequence: name },
    });
    return made!;
  });
}
