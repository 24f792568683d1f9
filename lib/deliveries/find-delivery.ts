import { eq } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import { deliveries } from "@/db/schema/deliveries";
import { people } from "@/db/schema/people";
import { productions } from "@/db/schema/productions";
import { found } from "../errors";

/** A delivery with its production and who made it. The caller decides who may see it. */
export async function findDelivery(db: Database | Transaction, deliveryId: string) {
  const [row] = await db
    .select({
      id: deliveries.id,
      number: deliveries.number,
      title: deliveries.title,
      words: deliveries.words,
      productionId: deliveries.productionId,
      production: productions.name,
      productionCode: productions.code,
      manifestDigest: deliveries.manifestDigest,
      bytes: deliveries.bytes,
      maker: people.name,
      madeAt: deliveries.madeAt,
      publishedAt: deliveries.publishedAt,
      withdrawnAt: deliveries.withdrawnAt,
      withdrawnWords: deliveries.withdrawnWords,
    })
    .from(deliveries)
    .innerJoin(productions, eq(productions.id, deliveries.productionId))
    .innerJoin(people, eq(people.id, deliveries.madeBy))
    .where(eq(deliveries.id, deliveryId));
  return found(row, "delivery");
}

export type FoundDelivery = Awaited<ReturnType<typeof findDelivery>>;
