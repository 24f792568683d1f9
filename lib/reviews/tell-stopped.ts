import { and, eq, gte, isNotNull, isNull, lte } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { deliveries, deliveryItems, recipients } from "@/db/schema/deliveries";
import { people } from "@/db/schema/people";
import { queueMail } from "../queue/outbox";
import type { FoundVersion } from "./find-version";
import { frameWords } from "./schema-declaration";
import type { GivenVerdict } from "./tell-verdict";

/**
 * Tells everyone a published delivery with these frames went to that its downloads are stopped. They are told of no frame
 * that was not delivered to them, and of the words only where the advisor wrote them for the recipients: on withdrawing.
 */
export async function tellStopped(
  tx: Transaction,
  version: FoundVersion,
  verdict: GivenVerdict,
): Promise<void> {
  for (const row of await findAffected(tx, version.id, verdict)) {
    const frames = frameWords(Math.max(row.first, verdict.first), Math.min(row.last, verdict.last));
    const why =
      verdict.kind === "withdrawn"
        ? `The science advisor has withdrawn the sign-off of ${frames} of ${version.shotCode}, version ${version.number}: “${verdict.words}”`
        : `The science advisor no longer signs ${frames} of ${version.shotCode}, version ${version.number}.`;
    await queueMail(tx, `delivery.stopped ${verdict.id} ${row.deliveryId} ${row.personId}`, {
      to: row.email,
      subject: `Downloads of delivery ${row.number}, ${row.title}, are stopped`,
      paragraphs: [
        why,
        "The delivery can no longer be taken. If you have it already, please do not use these frames.",
        "The studio will tell you what follows.",
      ],
      action: { label: "Open the delivery", path: `/deliveries/${row.deliveryId}` },
    });
  }
}

async function findAffected(tx: Transaction, versionId: string, { first, last }: GivenVerdict) {
  return tx
    .select({
      deliveryId: deliveries.id,
      number: deliveries.number,
      title: deliveries.title,
      first: deliveryItems.first,
      last: deliveryItems.last,
      personId: people.id,
      email: people.email,
    })
    .from(deliveryItems)
    .innerJoin(deliveries, eq(deliveries.id, deliveryItems.deliveryId))
    .innerJoin(recipients, eq(recipients.deliveryId, deliveries.id))
    .innerJoin(people, eq(people.id, recipients.personId))
    .where(
      and(
        eq(deliveryItems.versionId, versionId),
        lte(deliveryItems.first, last),
        gte(deliveryItems.last, first),
        isNotNull(deliveries.publishedAt),
        isNull(deliveries.withdrawnAt),
        isNull(people.leftAt),
      ),
    );
}
