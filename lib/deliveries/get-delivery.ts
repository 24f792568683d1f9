import type { z } from "zod";
import { authorize, may } from "../auth/authorize";
import type { Ctx } from "../context";
import { findMembers } from "../reviews/find-members";
import { scienceNotePath } from "./compose-documents";
import { findDelivery } from "./find-delivery";
import { findEntry } from "./find-entry";
import { findDownloads, findRecipients } from "./find-recipients";
import { findSets, findTexts } from "./find-sets";
import { findStops } from "./find-stops";
import { packageName } from "./lay-out";
import { deliveryIdSchema } from "./schema";
import { deliveryStanding } from "./standing";

/** The studio's page of a delivery: what is in it, whom it went to, what they took and signed, and what stops it. */
export async function getDelivery(ctx: Ctx, input: z.infer<typeof deliveryIdSchema>) {
  const delivery = await findDelivery(ctx.db, input.delivery);
  authorize(ctx.actor, "delivery.see", delivery.productionId);
  const [sets, texts, note, recipients, downloads, stops, clients] = await Promise.all([
    findSets(ctx.db, delivery.id),
    findTexts(ctx.db, delivery.id),
    findEntry(ctx.db, delivery.id, scienceNotePath),
    findRecipients(ctx.db, [delivery.id]),
    findDownloads(ctx.db, delivery.id),
    findStops(ctx.db, [delivery.id]),
    findMembers(ctx.db, delivery.productionId, ["client"]),
  ]);
  return {
    ...delivery,
    madeAt: delivery.madeAt.toISOString(),
    publishedAt: delivery.publishedAt?.toISOString() ?? null,
    withdrawnAt: delivery.withdrawnAt?.toISOString() ?? null,
    folder: packageName(delivery.productionCode, delivery.number),
    files: texts.length + sets.reduce((sum, set) => sum + set.files, 0),
    note: note?.body ?? "",
    standing: deliveryStanding({
      withdrawn: delivery.withdrawnAt !== null,
      published: delivery.publishedAt !== null,
      stopped: stops.length > 0,
      receipts: recipients.flatMap(({ receipt }) => (receipt ? [receipt] : [])),
      recipients: recipients.length,
    }),
    ...{ sets, texts, recipients, downloads, stops },
    clients: clients.map(({ id, name }) => ({ id, name })),
    reader: { name: ctx.actor.name, timeZone: ctx.actor.timeZone },
    mayPublish: may(ctx.actor, "delivery.publish", delivery.productionId),
    mayWithdraw: may(ctx.actor, "delivery.withdraw", delivery.productionId),
  };
}

export type DeliveryPage = Awaited<ReturnType<typeof getDelivery>>;
