import { and, eq, gt, gte, inArray, lte, ne } from "drizzle-orm";
import { alias } from "drizzle-orm/pg-core";
import type { Database, Transaction } from "@/db/client";
import { deliveryItems } from "@/db/schema/deliveries";
import { verdicts } from "@/db/schema/reviews";
import { shots } from "@/db/schema/shots";
import { versions } from "@/db/schema/versions";

const later = alias(verdicts, "later");

/**
 * The verdicts that stop these deliveries: given after the one a delivery rests on, on some of its frames, and no sign-off.
 * A later sign-off does not undo it: what was delivered rests on a verdict that no longer stands.
 */
export async function findStops(db: Database | Transaction, deliveryIds: string[]) {
  if (deliveryIds.length === 0) return [];
  const rows = await db
    .select({
      deliveryId: deliveryItems.deliveryId,
      versionId: deliveryItems.versionId,
      shotCode: shots.code,
      number: versions.number,
      kind: later.kind,
      first: later.first,
      last: later.last,
      itemFirst: deliveryItems.first,
      itemLast: deliveryItems.last,
      words: later.words,
      at: later.givenAt,
    })
    .from(deliveryItems)
    .innerJoin(verdicts, eq(verdicts.id, deliveryItems.verdictId))
    .innerJoin(
      later,
      and(
        eq(later.versionId, deliveryItems.versionId),
        ne(later.kind, "signed off"),
        gt(later.givenAt, verdicts.givenAt),
        lte(later.first, deliveryItems.last),
        gte(later.last, deliveryItems.first),
      ),
    )
    .innerJoin(versions, eq(versions.id, deliveryItems.versionId))
    .innerJoin(shots, eq(shots.id, versions.shotId))
    .where(inArray(deliveryItems.deliveryId, deliveryIds))
    .orderBy(later.givenAt, shots.code);
  return rows.map(({ itemFirst, itemLast, first, last, at, ...row }) => ({
    ...row,
    // Only frames of the delivery itself are named.
    first: Math.max(first, itemFirst),
    last: Math.min(last, itemLast),
    at: at.toISOString(),
  }));
}

export type Stop = Awaited<ReturnType<typeof findStops>>[number];
