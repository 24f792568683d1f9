import { and, eq, isNull } from "drizzle-orm";
import type { z } from "zod";
import type { Transaction } from "@/db/client";
import { links, memberships, people } from "@/db/schema/people";
import { productions } from "@/db/schema/productions";
import { authorize } from "../auth/authorize";
import type { Actor, Ctx } from "../context";
import { DomainError, found } from "../errors";
import { recordEvent } from "../events/record";
import { queueMail } from "../queue/outbox";
import { revokeLinks } from "./revoke-links";
import type { inviteInput } from "./schema";
import { newLink } from "./token";

const sevenDays = 7 * 24 * 60 * 60 * 1000;

/** Invites an e-mail address into a production. A newer invitation takes an older one's place. */
export async function invitePerson(ctx: Ctx, input: z.infer<typeof inviteInput>): Promise<{ id: string }> {
  const { productionId, email, name, role } = input;
  authorize(ctx.actor, "people.invite", productionId);
  return ctx.db.transaction(async (tx) => {
    const [row] = await tx.select().from(productions).where(eq(productions.id, productionId));
    const production = found(row, "production");
    await refuseKnown(tx, ctx.actor, productionId, email);
    await revokeLinks(tx, { purpose: "invitation", email, productionId });
    const link = newLink();
    const expiresAt = new Date(Date.now() + sevenDays);
    await tx.insert(links).values({
      ...link,
      purpose: "invitation",
      email,
      name,
      productionId,
      role,
      createdBy: ctx.actor.id,
      expiresAt,
    });
    await recordEvent(tx, {
      productionId,
      actorId: ctx.actor.id,
      kind: "person.invited",
      subject: { by: ctx.actor.name, email, role, invitationId: link.id },
    });
    await queueMail(tx, `invitation ${link.id}`, letter(ctx.actor.name, production.name, input, link.id));
    return { id: link.id };
  });
}

async function refuseKnown(
  tx: Transaction,
  actor: Actor,
  productionId: string,
  email: string,
): Promise<void> {
  const [known] = await tx
    .select({ name: people.name, leftAt: people.leftAt, role: memberships.role, isOwner: people.isOwner })
    .from(people)
    .leftJoin(
      memberships,
      and(
        eq(memberships.personId, people.id),
        eq(memberships.productionId, productionId),
        isNull(memberships.endedAt),
      ),
    )
    .where(eq(people.email, email));
  if (known?.role)
    throw new DomainError(
      "conflict",
      `${known.name} is in this production already, as ${known.role}.`,
      "email",
    );
  if (known?.leftAt && !actor.isOwner)
    throw new DomainError(
      "conflict",
      `The account of ${known.name} was closed. Only the studio's owner can invite them back.`,
      "email",
    );
}

function letter(
  by: string,
  production: string,
  { email, name, role }: z.infer<typeof inviteInput>,
  link: string,
) {
  const article = role === "artist" || role === "advisor" ? "an" : "a";
  const roleWords = role === "advisor" ? "science advisor" : role;
  return {
    to: email,
    subject: `${by} invites you to ${production}`,
    paragraphs: [
      `${name}, ${by} invites you to the production ${production} as ${role === "advisor" ? "its" : article} ${roleWords}.`,
      "The link below works once, and for seven days. If you did not expect this letter, do nothing: without the link nobody can join in your name.",
    ],
    action: { label: "Accept the invitation", path: "/invitation/", link },
  };
}
