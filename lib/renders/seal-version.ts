import { eq, sql } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import { people } from "@/db/schema/people";
import { frameFiles, renders, seals, versions } from "@/db/schema/versions";
import { recordEvent } from "../events/record";
import { queueMail } from "../queue/outbox";
import { nameVersion, type NamedVersion } from "../versions/name-version";

/**
 * Seals a version whose frames are all there: its digest, made by the database, its event and one letter to its maker.
 * Does nothing while frames are missing, or when it was sealed or stopped before. Returns whether it is sealed now.
 */
export async function sealVersion(db: Database, versionId: string): Promise<boolean> {
  return db.transaction(async (tx) => {
    // Everyone locks the render before its version, so that two can never wait for each other.
    const [render] = await tx.select().from(renders).where(eq(renders.versionId, versionId)).for("update");
    const [version] = await tx.select().from(versions).where(eq(versions.id, versionId));
    if (!version || !render) return false;
    if (render.state === "complete") return true;
    if (render.state !== "rendering") return false;

    const frameCount = version.last - version.first + 1;
    const kept = await countFiles(tx, versionId);
    if (kept.files < 2 * frameCount) return false;

    await tx.insert(seals).values({
      versionId,
      digest: sql<string>`version_digest(${versionId})`,
      frameCount,
      bytes: kept.bytes,
    });
    await tx
      .update(renders)
      .set({
        state: "complete",
        failedFrame: null,
        failure: null,
        changedAt: sql`now()`,
        finishedAt: sql`now()`,
      })
      .where(eq(renders.versionId, versionId));
    await tellComplete(tx, await nameVersion(tx, versionId));
    return true;
  });
}

async function countFiles(tx: Transaction, versionId: string): Promise<{ files: number; bytes: number }> {
  const [kept] = await tx
    .select({
      files: sql<number>`count(*)::int`,
      bytes: sql<number>`coalesce(sum(${frameFiles.bytes}), 0)::float8`,
    })
    .from(frameFiles)
    .where(eq(frameFiles.versionId, versionId));
  return kept!;
}

async function tellComplete(tx: Transaction, version: NamedVersion): Promise<void> {
  const { id, productionId, shot, number, frames, madeBy } = version;
  await recordEvent(tx, {
    productionId,
    actorId: null,
    kind: "version.complete",
    subject: { versionId: id, shotId: version.shotId, version: number, shot, frames },
  });
  const [maker] = await tx.select().from(people).where(eq(people.id, madeBy));
  if (!maker || maker.leftAt) return;
  await queueMail(tx, `version.complete ${id}`, {
    to: maker.email,
    subject: `Version ${number} of ${shot} is whole`,
    paragraphs: [
      `Version ${number} of ${shot} has all its frames, ${frames}, and is sealed under its digest.`,
      "Look through it, and send it for review when you are content with it.",
    ],
    action: { label: `Open version ${number} of ${shot}`, path: `/versions/${id}` },
  });
}
