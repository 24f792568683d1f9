import type { Ctx } from "../context";
import { recordEvent } from "../events/record";
import { log } from "../log";
import { queueMail } from "../queue/outbox";
import { findMembers } from "../reviews/find-members";
import type { DamagedFile } from "./byte-streams";
import { findDelivery } from "./find-delivery";

/** Names the file whose stored bytes are not those that were signed, in the process's log, in the production's and to its producers. */
export async function reportDamage(
  ctx: Ctx,
  input: { delivery: string; damage: DamagedFile },
): Promise<void> {
  const { path } = input.damage;
  log.error({ requestId: ctx.requestId, deliveryId: input.delivery, file: path }, "damaged file in storage");
  await ctx.db.transaction(async (tx) => {
    const delivery = await findDelivery(tx, input.delivery);
    await recordEvent(tx, {
      productionId: delivery.productionId,
      actorId: null,
      kind: "delivery.damaged",
      subject: { file: path, delivery: delivery.number, deliveryId: delivery.id },
    });
    for (const producer of await findMembers(tx, delivery.productionId, ["producer"]))
      await queueMail(tx, `delivery.damaged ${delivery.id} ${path} ${producer.id}`, {
        to: producer.email,
        subject: `A file of delivery ${delivery.number} is damaged in storage`,
        paragraphs: [
          `While it was being taken, ${path} of delivery ${delivery.number}, ${delivery.title}, proved not to be as it was signed. The download was broken off, so the client does not have it.`,
          "Restore the storage from its backup; the delivery itself is unchanged and can then be taken.",
        ],
        action: { label: "Open the delivery", path: `/deliveries/${delivery.id}` },
      });
  });
}
