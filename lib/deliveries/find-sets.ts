import { and, asc, eq, sql } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import { deliveryDocuments, deliveryFiles, deliveryItems } from "@/db/schema/deliveries";
import { people } from "@/db/schema/people";
import { verdicts } from "@/db/schema/reviews";
import { shots } from "@/db/schema/shots";
import { versions } from "@/db/schema/versions";
import { setupFromJson } from "@/render/scene/parse-setup";
import type { Setup } from "@/render/scene/setup";
import { setName } from "./lay-out";

/** A delivery's sets: each version's frames as they are delivered, who signed them, and their size. */
export async function findSets(db: Database | Transaction, deliveryId: string) {
  const rows = await findSetRows(db, deliveryId);
  return rows.map(({ setup: text, signedAt, ...row }) => {
    const parsed = setupFromJson(text);
    const setup = parsed.ok ? parsed.value : null;
    return {
      ...row,
      name: setName(row),
      signedAt: signedAt.toISOString(),
      format: formatOf(row, setup),
      seen: setup ? seenFrom(setup) : "",
      picture: setup ? { width: setup.picture.width, height: setup.picture.height } : null,
      hole: setup?.hole ?? null,
      hasDisk: setup !== null && setup.disk !== null,
    };
  });
}

export type DeliveredSet = Awaited<ReturnType<typeof findSets>>[number];

async function findSetRows(db: Database | Transaction, deliveryId: string) {
  return db
    .select({
      version: deliveryItems.versionId,
      shotCode: shots.code,
      number: versions.number,
      first: deliveryItems.first,
      last: deliveryItems.last,
      digest: deliveryItems.digest,
      quality: versions.quality,
      setup: versions.setup,
      advisor: people.name,
      advisorWords: verdicts.words,
      signedAt: verdicts.givenAt,
      files: sql<number>`count(*)::int`,
      bytes: sql<number>`sum(${deliveryFiles.bytes})::float8`,
      pngs: sql<number>`count(*) filter (where ${deliveryFiles.kind} = 'png')::int`,
      exrs: sql<number>`count(*) filter (where ${deliveryFiles.kind} = 'exr')::int`,
    })
    .from(deliveryItems)
    .innerJoin(versions, eq(versions.id, deliveryItems.versionId))
    .innerJoin(shots, eq(shots.id, versions.shotId))
    .innerJoin(verdicts, eq(verdicts.id, deliveryItems.verdictId))
    .innerJoin(people, eq(people.id, verdicts.givenBy))
    .innerJoin(
      deliveryFiles,
      and(
        eq(deliveryFiles.deliveryId, deliveryItems.deliveryId),
        eq(deliveryFiles.versionId, deliveryItems.versionId),
      ),
    )
    .where(eq(deliveryItems.deliveryId, deliveryId))
    .groupBy(deliveryItems.deliveryId, deliveryItems.versionId, versions.id, shots.id, verdicts.id, people.id)
    .orderBy(asc(shots.code));
}

function formatOf({ pngs, exrs }: { pngs: number; exrs: number }, setup: Setup | null): string {
  const kinds = [...(pngs > 0 ? ["16-bit PNG"] : []), ...(exrs > 0 ? ["16-bit half EXR"] : [])].join(", ");
  return setup ? `${setup.picture.width} × ${setup.picture.height}, ${kinds}` : kinds;
}

const seenFrom = ({ camera }: Setup) =>
  `Seen from ${camera.radius.toLocaleString("en")} M, ${camera.inclinationDeg.toLocaleString("en")}° from the spin axis.`;

/** The texts of a delivery, without their words. */
export async function findTexts(db: Database | Transaction, deliveryId: string) {
  return db
    .select({
      path: deliveryDocuments.path,
      sha256: deliveryDocuments.sha256,
      bytes: sql<number>`octet_length(${deliveryDocuments.body})`,
    })
    .from(deliveryDocuments)
    .where(eq(deliveryDocuments.deliveryId, deliveryId))
    .orderBy(sql`${deliveryDocuments.path} collate "C"`);
}
