import { and, asc, eq, inArray, sql } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import { downloads, receipts, recipients } from "@/db/schema/deliveries";
import { people } from "@/db/schema/people";

/** Who deliveries were published to, what each has taken and what they signed. */
export async function findRecipients(db: Database | Transaction, deliveryIds: string[]) {
  if (deliveryIds.length === 0) return [];
  const rows = await db
    .select({
      deliveryId: recipients.deliveryId,
      personId: recipients.personId,
      name: people.name,
      expiresAt: recipients.expiresAt,
      revoked: sql<boolean>`${recipients.revokedAt} is not null`,
      receipt: receipts.kind,
      receiptWords: receipts.words,
      statement: receipts.statement,
      signedAt: receipts.signedAt,
    })
    .from(recipients)
    .innerJoin(people, eq(people.id, recipients.personId))
    .leftJoin(
      receipts,
      and(eq(receipts.deliveryId, recipients.deliveryId), eq(receipts.personId, recipients.personId)),
    )
    .where(inArray(recipients.deliveryId, deliveryIds))
    .orderBy(asc(people.name));
  return rows.map(({ expiresAt, signedAt, ...row }) => ({
    ...row,
    expiresAt: expiresAt.toISOString(),
    signedAt: signedAt?.toISOString() ?? null,
  }));
}

/** What was taken of a delivery, newest first. */
export async function findDownloads(db: Database | Transaction, deliveryId: string) {
  const rows = await db
    .select({
      id: downloads.id,
      name: people.name,
      what: downloads.what,
      bytes: downloads.bytes,
      startedAt: downloads.startedAt,
      finishedAt: downloads.finishedAt,
    })
    .from(downloads)
    .innerJoin(people, eq(people.id, downloads.personId))
    .where(eq(downloads.deliveryId, deliveryId))
    .orderBy(sql`${downloads.startedAt} desc`)
    .limit(200);
  return rows.map(({ startedAt, finishedAt, ...row }) => ({
    ...row,
    startedAt: startedAt.toISOString(),
    finishedAt: finishedAt?.toISOString() ?? null,
  }));
}
