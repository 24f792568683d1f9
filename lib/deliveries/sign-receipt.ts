import { and, eq } from "drizzle-orm";
import type { z } from "zod";
import type { Transaction } from "@/db/client";
import { downloads, receipts } from "@/db/schema/deliveries";
import type { Ctx } from "../context";
import { DomainError } from "../errors";
import { recordEvent } from "../events/record";
import { queueMail } from "../queue/outbox";
import { findMembers } from "../reviews/find-members";
import { composeReceipt } from "./schema-receipt";
import type { FoundDelivery } from "./find-delivery";
import { findDoor, refuseShut, type Door } from "./find-door";
import { findContents } from "./find-contents";
import { signReceiptSchema } from "./schema";

type Signing = z.infer<typeof signReceiptSchema>;

/** The client's signed word, once: that everything arrived as it was signed, or that they refuse it and why. */
export async function signReceipt(ctx: Ctx, input: Signing) {
  const door = await findDoor(ctx, "door.sign", input.delivery);
  refuseUnfit(door, input);
  return ctx.db.transaction(async (tx) => {
    if (input.kind === "received") await refuseUntaken(tx, ctx, input.delivery);
    const files = (await findContents(tx, input.delivery)).length;
    const { productionId, number, title } = door.delivery;
    const { kind, words } = input;
    const statement = composeReceipt({ client: ctx.actor.name, number, title, files, ...input });
    const signedAt = await insertReceipt(tx, ctx, input, statement);
    await recordEvent(tx, {
      productionId,
      actorId: ctx.actor.id,
      kind: kind === "received" ? "receipt.signed" : "receipt.refused",
      subject: { by: ctx.actor.name, delivery: number, files, words, deliveryId: input.delivery },
    });
    await tellProducers(tx, ctx, door.delivery, statement, kind);
    return { statement, signedAt: signedAt.toISOString() };
  });
}

async function insertReceipt(tx: Transaction, ctx: Ctx, input: Signing, statement: string): Promise<Date> {
  const { delivery: deliveryId, kind, words, manifestDigest } = input;
  const [row] = await tx
    .insert(receipts)
    .values({ deliveryId, personId: ctx.actor.id, kind, manifestDigest, words, statement })
    .onConflictDoNothing()
    .returning({ signedAt: receipts.signedAt });
  if (row) return row.signedAt;
  throw new DomainError("conflict", "You have already signed for this delivery. A receipt is written once.");
}

function refuseUnfit(door: Door, { kind, manifestDigest }: Signing): void {
  // A stopped delivery can still be refused: the client may have it, and be right that something is wrong.
  if (kind === "received" || door.state.kind !== "stopped") refuseShut(door);
  if (manifestDigest !== door.delivery.manifestDigest)
    throw new DomainError("invalid", "This is not the digest of this delivery's manifest.", "manifestDigest");
}

async function refuseUntaken(tx: Transaction, ctx: Ctx, deliveryId: string): Promise<void> {
  const [taken] = await tx
    .select({ id: downloads.id })
    .from(downloads)
    .where(and(eq(downloads.deliveryId, deliveryId), eq(downloads.personId, ctx.actor.id)))
    .limit(1);
  if (!taken)
    throw new DomainError(
      "conflict",
      "Nothing of this delivery has been taken yet. Take the files and check them, then sign.",
    );
}

async function tellProducers(
  tx: Transaction,
  ctx: Ctx,
  delivery: FoundDelivery,
  statement: string,
  kind: Signing["kind"],
): Promise<void> {
  for (const producer of await findMembers(tx, delivery.productionId, ["producer"]))
    await queueMail(tx, `receipt ${delivery.id} ${ctx.actor.id} ${producer.id}`, {
      to: producer.email,
      subject: `${ctx.actor.name} has ${kind} delivery ${delivery.number}`,
      paragraphs: statement.split("\n\n"),
      action: { label: "Open the delivery", path: `/deliveries/${delivery.id}` },
    });
}
