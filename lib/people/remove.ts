import { and, eq, isNull } from "drizzle-orm";
import type { z } from "zod";
import { memberships, people } from "@/db/schema/people";
import { authorize } from "../auth/authorize";
import type { Ctx } from "../context";
import { found } from "../errors";
import { recordEvent } from "../events/record";
import type { removePersonInput } from "./schema";

/** Ends a person's membership of a production. They are out with their next request. */
export async function removePerson(ctx: Ctx, input: z.infer<typeof removePersonInput>): Promise<null> {
  const { production: productionId, person: personId } = input;
  authorize(ctx.actor, "people.remove", productionId);
  await ctx.db.transaction(async (tx) => {
    const ended = await tx
      .update(memberships)
      .set({ endedAt: new Date() })
      .where(
        and(
          eq(memberships.productionId, productionId),
          eq(memberships.personId, personId),
          isNull(memberships.endedAt),
        ),
      )
      .returning({ personId: memberships.personId });
    found(ended[0], "member");
    const [person] = await tx.select({ name: people.name }).from(people).where(eq(people.id, personId));
    await recordEvent(tx, {
      productionId,
      actorId: ctx.actor.id,
      kind: "person.removed",
      subject: { by: ctx.actor.name, person: found(person, "person").name, personId },
    });
  });
  return null;
}
