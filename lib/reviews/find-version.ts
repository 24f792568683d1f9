import { eq } from "drizzle-orm";
import { alias } from "drizzle-orm/pg-core";
import type { Database, Transaction } from "@/db/client";
import { people } from "@/db/schema/people";
import { productions } from "@/db/schema/productions";
import { submissions } from "@/db/schema/reviews";
import { shots } from "@/db/schema/shots";
import { renders, seals, versions } from "@/db/schema/versions";
import { found } from "../errors";
import { findNewestNumber } from "./find-newest-number";

const sender = alias(people, "sender");

/** A version with all that a review asks of it: its shot, its maker, its seal and whether it was sent. */
export async function findVersion(db: Database | Transaction, versionId: string) {
  const [row] = await db
    .select({
      id: versions.id,
      number: versions.number,
      productionId: versions.productionId,
      production: productions.name,
      productionCode: productions.code,
      shotId: versions.shotId,
      shotCode: shots.code,
      brief: shots.brief,
      dueOn: shots.dueOn,
      setup: versions.setup,
      setupDigest: versions.setupDigest,
      kernel: versions.kernel,
      quality: versions.quality,
      colourSpace: versions.colourSpace,
      first: versions.first,
      last: versions.last,
      madeBy: versions.madeBy,
      maker: people.name,
      digest: seals.digest,
      bytes: seals.bytes,
      renderState: renders.state,
      sentAt: submissions.sentAt,
      sentBy: submissions.sentBy,
      sentByName: sender.name,
      sentWords: submissions.words,
    })
    .from(versions)
    .innerJoin(shots, eq(shots.id, versions.shotId))
    .innerJoin(productions, eq(productions.id, versions.productionId))
    .innerJoin(people, eq(people.id, versions.madeBy))
    .leftJoin(seals, eq(seals.versionId, versions.id))
    .leftJoin(renders, eq(renders.versionId, versions.id))
    .leftJoin(submissions, eq(submissions.versionId, versions.id))
    .leftJoin(sender, eq(sender.id, submissions.sentBy))
    .where(eq(versions.id, versionId));
  return found(row, "version");
}

export type FoundVersion = Awaited<ReturnType<typeof findVersion>>;

/**
 * Holds the shot until the transaction ends: no version of it is begun and no verdict given meanwhile. Answers with the
 * number of its newest version.
 */
export async function holdShot(tx: Transaction, shotId: string): Promise<number> {
  await tx.select({ id: shots.id }).from(shots).where(eq(shots.id, shotId)).for("update");
  return findNewestNumber(tx, shotId);
}
