import { and, eq, isNotNull, isNull, ne, sql } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { downloads } from "@/db/schema/deliveries";
import type { Ctx } from "../context";
import { recordEvent } from "../events/record";
import { queueMail } from "../queue/outbox";
import { findMembers } from "../reviews/find-members";
import { findDelivery } from "./find-delivery";

/** Marks a download as whole. The log has a line for each thing a client took; the producers, one letter a client. */
export async function finishDownload(ctx: Ctx, input: { download: string; bytes: number }): Promise<void> {
  await ctx.db.transaction(async (tx) => {
    const [row] = await tx
      .update(downloads)
      .set({ bytes: input.bytes, finishedAt: sql`clock_timestamp()` })
      .where(
        and(
          eq(downloads.id, input.download),
          eq(downloads.personId, ctx.actor.id),
          isNull(downloads.finishedAt),
        ),
      )
      .returning();
    if (!row || (await wasTakenBefore(tx, row))) return;
    const delivery = await findDelivery(tx, row.deliveryId);
    const what = row.what;
    await recordEvent(tx, {
      productionId: delivery.productionId,
      actorId: ctx.actor.id,
      kind: "delivery.taken",
      subject: { by: ctx.actor.name, what, delivery: delivery.number, deliveryId: delivery.id },
    });
    for (const producer of await findMembers(tx, delivery.productionId, ["producer"]))
      await queueMail(tx, `delivery.taken ${delivery.id} ${ctx.actor.id} ${producer.id}`, {
        to: producer.email,
        subject: `${ctx.actor.name} has taken delivery ${delivery.number}`,
        paragraphs: [
          `${ctx.actor.name} has taken ${what} of delivery ${delivery.number}, ${delivery.title}.`,
          "Further downloads are on the delivery's page; a receipt will be told separately.",
        ],
        action: { label: "Open the delivery", path: `/deliveries/${delivery.id}` },
      });
  });
}

async function wasTakenBefore(tx: Transaction, row: typeof downloads.$inferSelect): Promise<boolean> {
  const [earlier] = await tx
    .select({ id: downloads.id })
    .from(downloads)
    .where(
      and(
        eq(downloads.deliveryId, row.deliveryId),
        eq(downloads.personId, row.personId),
        eq(downloads.what, row.what),
        ne(downloads.id, row.id),
        isNotNull(downloads.finishedAt),
      ),
    )
    .limit(1);
  return earlier !== undefined;
}
