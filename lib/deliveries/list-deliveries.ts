import { desc, eq, inArray, sql } from "drizzle-orm";
import { deliveries, deliveryDocuments, deliveryFiles } from "@/db/schema/deliveries";
import { people } from "@/db/schema/people";
import { productions } from "@/db/schema/productions";
import { may, productionsWhere } from "../auth/authorize";
import type { Ctx } from "../context";
import { findRecipients } from "./find-recipients";
import { findStops } from "./find-stops";
import { deliveryStanding } from "./standing";

/** Every delivery of the reader's productions, newest first, with where each stands and who has what of it. */
export async function listDeliveries(ctx: Ctx) {
  const scope = productionsWhere(ctx.actor, "delivery.see");
  const rows = scope.length > 0 ? await findRows(ctx, scope) : [];
  const ids = rows.map(({ id }) => id);
  const [recipients, stops] = await Promise.all([findRecipients(ctx.db, ids), findStops(ctx.db, ids)]);
  return rows.map(({ madeAt, publishedAt, withdrawnAt, ...row }) => {
    const theirs = recipients.filter(({ deliveryId }) => deliveryId === row.id);
    const stopped = stops.some(({ deliveryId }) => deliveryId === row.id);
    const receipts = theirs.flatMap(({ receipt }) => (receipt ? [receipt] : []));
    return {
      ...row,
      madeAt: madeAt.toISOString(),
      publishedAt: publishedAt?.toISOString() ?? null,
      withdrawnAt: withdrawnAt?.toISOString() ?? null,
      stopped,
      recipients: theirs.map(({ name }) => name),
      received: receipts.filter((kind) => kind === "received").length,
      standing: deliveryStanding({
        withdrawn: withdrawnAt !== null,
        published: publishedAt !== null,
        stopped,
        receipts,
        recipients: theirs.length,
      }),
      yours: may(ctx.actor, "delivery.publish", row.productionId),
    };
  });
}

export type DeliveryLine = Awaited<ReturnType<typeof listDeliveries>>[number];

async function findRows(ctx: Ctx, scope: string[]) {
  return ctx.db
    .select({
      id: deliveries.id,
      number: deliveries.number,
      title: deliveries.title,
      productionId: deliveries.productionId,
      production: productions.name,
      bytes: deliveries.bytes,
      maker: people.name,
      madeAt: deliveries.madeAt,
      publishedAt: deliveries.publishedAt,
      withdrawnAt: deliveries.withdrawnAt,
      files: sql<number>`(select count(*)::int from ${deliveryFiles} f where f.delivery_id = ${deliveries.id}) + (select count(*)::int from ${deliveryDocuments} t where t.delivery_id = ${deliveries.id})`,
    })
    .from(deliveries)
    .innerJoin(productions, eq(productions.id, deliveries.productionId))
    .innerJoin(people, eq(people.id, deliveries.madeBy))
    .where(inArray(deliveries.productionId, scope))
    .orderBy(desc(deliveries.madeAt));
}
