import { and, desc, eq, gt, inArray, isNotNull, isNull, sql } from "drizzle-orm";
import { deliveries, downloads, receipts, recipients } from "@/db/schema/deliveries";
import { productions } from "@/db/schema/productions";
import { productionsWhere } from "../auth/authorize";
import type { Ctx } from "../context";
import { findStops } from "./find-stops";

/** The deliveries whose doors stand open to this client, newest first; a stopped one is listed as stopped. */
export async function listDoors(ctx: Ctx) {
  const scope = productionsWhere(ctx.actor, "door.open");
  const rows = scope.length > 0 ? await findOpen(ctx, scope) : [];
  const stops = await findStops(
    ctx.db,
    rows.map(({ id }) => id),
  );
  return rows.map(({ publishedAt, expiresAt, ...row }) => ({
    ...row,
    publishedAt: publishedAt!.toISOString(),
    until: expiresAt.toISOString(),
    stopped: stops.some(({ deliveryId }) => deliveryId === row.id),
  }));
}

export type DoorLine = Awaited<ReturnType<typeof listDoors>>[number];

async function findOpen(ctx: Ctx, scope: string[]) {
  return ctx.db
    .select({
      id: deliveries.id,
      number: deliveries.number,
      title: deliveries.title,
      production: productions.name,
      bytes: deliveries.bytes,
      publishedAt: deliveries.publishedAt,
      expiresAt: recipients.expiresAt,
      receipt: receipts.kind,
      taken: sql<boolean>`exists (select 1 from ${downloads} d where d.delivery_id = ${deliveries.id} and d.person_id = ${ctx.actor.id} and d.finished_at is not null)`,
    })
    .from(recipients)
    .innerJoin(deliveries, eq(deliveries.id, recipients.deliveryId))
    .innerJoin(productions, eq(productions.id, deliveries.productionId))
    .leftJoin(
      receipts,
      and(eq(receipts.deliveryId, recipients.deliveryId), eq(receipts.personId, recipients.personId)),
    )
    .where(
      and(
        eq(recipients.personId, ctx.actor.id),
        inArray(deliveries.productionId, scope),
        isNull(recipients.revokedAt),
        gt(recipients.expiresAt, sql`now()`),
        isNotNull(deliveries.publishedAt),
        isNull(deliveries.withdrawnAt),
      ),
    )
    .orderBy(desc(deliveries.publishedAt));
}
