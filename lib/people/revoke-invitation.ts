import { and, eq, isNull } from "drizzle-orm";
import type { z } from "zod";
import { links } from "@/db/schema/people";
import { authorize } from "../auth/authorize";
import type { Ctx } from "../context";
import { DomainError, found } from "../errors";
import { recordEvent } from "../events/record";
import type { revokeInput } from "./schema";

/** Takes an invitation back: its link stops working. */
export async function revokeInvitation(ctx: Ctx, { invitation }: z.infer<typeof revokeInput>): Promise<null> {
  const [row] = await ctx.db
    .select()
    .from(links)
    .where(and(eq(links.id, invitation), eq(links.purpose, "invitation")));
  const { productionId, email } = found(row, "invitation");
  authorize(ctx.actor, "people.invite", productionId);
  await ctx.db.transaction(async (tx) => {
    const revoked = await tx
      .update(links)
      .set({ revokedAt: new Date() })
      .where(and(eq(links.id, invitation), isNull(links.usedAt), isNull(links.revokedAt)))
      .returning({ id: links.id });
    if (revoked.length === 0)
      throw new DomainError("conflict", `The invitation to ${email} was used or taken back already.`);
    await recordEvent(tx, {
      productionId,
      actorId: ctx.actor.id,
      kind: "invitation.revoked",
      subject: { by: ctx.actor.name, email, invitationId: invitation },
    });
  });
  return null;
}
