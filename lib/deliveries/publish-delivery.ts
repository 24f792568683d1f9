import { and, eq, isNull, sql } from "drizzle-orm";
import type { z } from "zod";
import type { Transaction } from "@/db/client";
import { deliveries, deliveryItems, recipients } from "@/db/schema/deliveries";
import { shots } from "@/db/schema/shots";
import { versions } from "@/db/schema/versions";
import { authorize } from "../auth/authorize";
import type { Ctx } from "../context";
import { DomainError } from "../errors";
import { recordEvent } from "../events/record";
import { queueMail } from "../queue/outbox";
import { findMembers, type Member } from "../reviews/find-members";
import { frameWords } from "../reviews/schema-declaration";
import { findDelivery, type FoundDelivery } from "./find-delivery";
import { findStops } from "./find-stops";
import { publishDeliverySchema } from "./schema";

/** Opens a door for each chosen client, for some days. From then on the delivery is closed: nothing in it changes. */
export async function publishDelivery(ctx: Ctx, input: z.infer<typeof publishDeliverySchema>) {
  const { productionId } = await findDelivery(ctx.db, input.delivery);
  authorize(ctx.actor, "delivery.publish", productionId);
  return ctx.db.transaction(async (tx) => {
    await holdShots(tx, input.delivery);
    await refuseStopped(tx, input.delivery);
    const chosen = await findChosen(tx, productionId, input.recipients);
    const { publishedAt, expiresAt } = await openDoors(tx, ctx.actor.id, chosen, input);
    const delivery = await findDelivery(tx, input.delivery);
    await recordEvent(tx, {
      productionId,
      actorId: ctx.actor.id,
      kind: "delivery.published",
      subject: {
        by: ctx.actor.name,
        delivery: delivery.number,
        title: delivery.title,
        to: chosen.map(({ name }) => name).join(", "),
        deliveryId: delivery.id,
      },
    });
    await tellRecipients(tx, delivery, chosen, expiresAt);
    return {
      delivery: delivery.id,
      publishedAt: publishedAt.toISOString(),
      expiresAt: expiresAt.toISOString(),
    };
  });
}

async function openDoors(
  tx: Transaction,
  actorId: string,
  chosen: Member[],
  { delivery, days }: z.infer<typeof publishDeliverySchema>,
) {
  const [row] = await tx
    .update(deliveries)
    .set({ publishedAt: sql`now()`, publishedBy: actorId })
    .where(and(eq(deliveries.id, delivery), isNull(deliveries.publishedAt), isNull(deliveries.withdrawnAt)))
    .returning({ publishedAt: deliveries.publishedAt });
  if (!row?.publishedAt)
    throw new DomainError(
      "conflict",
      "This delivery has been published or withdrawn meanwhile. Load the page again.",
    );
  const expiresAt = new Date(row.publishedAt.getTime() + days * 86_400_000);
  await tx
    .insert(recipients)
    .values(chosen.map(({ id }) => ({ deliveryId: delivery, personId: id, expiresAt })));
  return { publishedAt: row.publishedAt, expiresAt };
}

// A verdict withdrawn at the same moment either is seen here, or sees this delivery as published and tells its recipients.
async function holdShots(tx: Transaction, deliveryId: string): Promise<void> {
  const held = await tx
    .select({ id: versions.shotId })
    .from(deliveryItems)
    .innerJoin(versions, eq(versions.id, deliveryItems.versionId))
    .where(eq(deliveryItems.deliveryId, deliveryId))
    .orderBy(versions.shotId);
  for (const { id } of held)
    await tx.select({ id: shots.id }).from(shots).where(eq(shots.id, id)).for("update");
}

async function refuseStopped(tx: Transaction, deliveryId: string): Promise<void> {
  const [stop] = await findStops(tx, [deliveryId]);
  if (!stop) return;
  throw new DomainError(
    "conflict",
    `${stop.shotCode}, ${frameWords(stop.first, stop.last)}, was ${stop.kind === "withdrawn" ? "withdrawn" : "returned"} by the advisor after this delivery was made. Withdraw the delivery and assemble another.`,
  );
}

async function findChosen(tx: Transaction, productionId: string, ids: string[]): Promise<Member[]> {
  const clients = await findMembers(tx, productionId, ["client"]);
  const chosen = clients.filter(({ id }) => ids.includes(id));
  if (chosen.length === ids.length) return chosen;
  throw new DomainError(
    "invalid",
    "A delivery goes to clients of its own production; one of these is none.",
    "recipients",
  );
}

async function tellRecipients(
  tx: Transaction,
  delivery: FoundDelivery,
  chosen: Member[],
  until: Date,
): Promise<void> {
  for (const person of chosen)
    await queueMail(tx, `delivery.published ${delivery.id} ${person.id}`, {
      to: person.email,
      subject: `Delivery ${delivery.number} of ${delivery.production} is ready: ${delivery.title}`,
      paragraphs: [
        `${delivery.production} has published delivery ${delivery.number} to you: ${delivery.title}.`,
        ...(delivery.words ? [delivery.words] : []),
        `It can be taken until ${until.toISOString().slice(0, 10)}. Please check what arrives, and sign the receipt on the same page.`,
      ],
      action: { label: "Open the delivery", path: `/deliveries/${delivery.id}` },
    });
}
