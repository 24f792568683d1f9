import { and, eq, isNull, sql } from "drizzle-orm";
import type { z } from "zod";
import type { Transaction } from "@/db/client";
import { deliveries, recipients } from "@/db/schema/deliveries";
import { people } from "@/db/schema/people";
import { authorize } from "../auth/authorize";
import type { Ctx } from "../context";
import { DomainError } from "../errors";
import { recordEvent } from "../events/record";
import { queueMail } from "../queue/outbox";
import { findDelivery, type FoundDelivery } from "./find-delivery";
import { withdrawDeliverySchema } from "./schema";

/** Closes a delivery's doors for good, whether or not it was published, and tells whoever it was published to. */
export async function withdrawDelivery(ctx: Ctx, input: z.infer<typeof withdrawDeliverySchema>) {
  const { productionId } = await findDelivery(ctx.db, input.delivery);
  authorize(ctx.actor, "delivery.withdraw", productionId);
  return ctx.db.transaction(async (tx) => {
    const [row] = await tx
      .update(deliveries)
      .set({ withdrawnAt: sql`now()`, withdrawnWords: input.words })
      .where(and(eq(deliveries.id, input.delivery), isNull(deliveries.withdrawnAt)))
      .returning({ withdrawnAt: deliveries.withdrawnAt });
    if (!row) throw new DomainError("conflict", "This delivery has already been withdrawn.");
    const delivery = await findDelivery(tx, input.delivery);
    await recordEvent(tx, {
      productionId,
      actorId: ctx.actor.id,
      kind: "delivery.withdrawn",
      subject: { by: ctx.actor.name, delivery: delivery.number, words: input.words, deliveryId: delivery.id },
    });
    await tellRecipients(tx, delivery, input.words);
    return { delivery: delivery.id, withdrawnAt: row.withdrawnAt!.toISOString() };
  });
}

async function tellRecipients(tx: Transaction, delivery: FoundDelivery, words: string): Promise<void> {
  const told = await tx
    .select({ id: people.id, email: people.email })
    .from(recipients)
    .innerJoin(people, eq(people.id, recipients.personId))
    .where(and(eq(recipients.deliveryId, delivery.id), isNull(people.leftAt)));
  for (const person of told)
    await queueMail(tx, `delivery.withdrawn ${delivery.id} ${person.id}`, {
      to: person.email,
      subject: `Delivery ${delivery.number} of ${delivery.production} is withdrawn`,
      paragraphs: [
        `${delivery.production} has withdrawn delivery ${delivery.number}, ${delivery.title}: “${words}”`,
        "It can no longer be taken. If you have it already, please do not use it.",
      ],
    });
}
