import { and, eq, isNull, sql } from "drizzle-orm";
import type { z } from "zod";
import type { Transaction } from "@/db/client";
import { memberships, people } from "@/db/schema/people";
import { authorize } from "../auth/authorize";
import type { Actor, Ctx } from "../context";
import { DomainError, found } from "../errors";
import { recordEvent } from "../events/record";
import { revokeLinks } from "./revoke-links";
import type { closeAccountInput } from "./schema";

/** Closes a person's account: no session, no membership and no link of theirs works any longer. What they did stays. */
export async function closeAccount(
  ctx: Ctx,
  { person: id }: z.infer<typeof closeAccountInput>,
): Promise<null> {
  authorize(ctx.actor, "people.close", null);
  if (id === ctx.actor.id)
    throw new DomainError("conflict", "You cannot close your own account: the studio would have no owner.");
  await ctx.db.transaction(async (tx) => {
    const [row] = await tx
      .update(people)
      .set({ leftAt: new Date(), sessionEpoch: sql`${people.sessionEpoch} + 1` })
      .where(and(eq(people.id, id), isNull(people.leftAt)))
      .returning({ id: people.id, name: people.name, email: people.email });
    const person = found(row, "account");
    await endMemberships(tx, ctx.actor, person);
    await revokeLinks(tx, { purpose: "invitation", email: person.email });
    await revokeLinks(tx, { purpose: "password reset", email: person.email });
    await recordEvent(tx, {
      productionId: null,
      actorId: ctx.actor.id,
      kind: "person.left",
      subject: { by: ctx.actor.name, person: person.name, personId: id },
    });
  });
  return null;
}

async function endMemberships(tx: Transaction, actor: Actor, person: { id: string; name: string }) {
  const ended = await tx
    .update(memberships)
    .set({ endedAt: new Date() })
    .where(and(eq(memberships.personId, person.id), isNull(memberships.endedAt)))
    .returning({ productionId: memberships.productionId });
  for (const { productionId } of ended)
    await recordEvent(tx, {
      productionId,
      actorId: actor.id,
      kind: "person.removed",
      subject: { by: actor.name, person: person.name, personId: person.id },
    });
}
