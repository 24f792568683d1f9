import { and, eq, sql } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import { deliveryDocuments, deliveryFiles, deliveryItems } from "@/db/schema/deliveries";
import { shots } from "@/db/schema/shots";
import { versions } from "@/db/schema/versions";
import { found } from "../errors";
import { setName } from "./lay-out";

export interface PackageEntry {
  path: string;
  sha256: string;
  bytes: number;
  /** A text of the delivery; a frame's file is read from storage. */
  body?: string;
}

/** Everything in the package, or one version's set with the texts that go with it: texts first, then frames by path. */
export async function findContents(
  db: Database | Transaction,
  deliveryId: string,
  set?: { versionId: string; name: string },
): Promise<PackageEntry[]> {
  const documents = await db
    .select({
      path: deliveryDocuments.path,
      sha256: deliveryDocuments.sha256,
      body: deliveryDocuments.body,
      bytes: sql<number>`octet_length(${deliveryDocuments.body})`,
    })
    .from(deliveryDocuments)
    .where(eq(deliveryDocuments.deliveryId, deliveryId))
    .orderBy(sql`${deliveryDocuments.path} collate "C"`);
  const files = await db
    .select({ path: deliveryFiles.path, sha256: deliveryFiles.sha256, bytes: deliveryFiles.bytes })
    .from(deliveryFiles)
    .where(
      and(
        eq(deliveryFiles.deliveryId, deliveryId),
        set ? eq(deliveryFiles.versionId, set.versionId) : undefined,
      ),
    )
    .orderBy(sql`${deliveryFiles.path} collate "C"`);
  return [...documents.filter(({ path }) => belongs(path, set?.name)), ...files];
}

/** science/<set>/… goes with its set; every other text goes with all. */
function belongs(path: string, name?: string): boolean {
  const folders = path.split("/");
  return name === undefined || folders.length < 3 || folders[1] === name;
}

/** The delivered set of a version, by the name its files begin with. */
export async function findSet(db: Database | Transaction, deliveryId: string, versionId: string) {
  const [row] = await db
    .select({ shotCode: shots.code, number: versions.number })
    .from(deliveryItems)
    .innerJoin(versions, eq(versions.id, deliveryItems.versionId))
    .innerJoin(shots, eq(shots.id, versions.shotId))
    .where(and(eq(deliveryItems.deliveryId, deliveryId), eq(deliveryItems.versionId, versionId)));
  const item = found(row, "set in this delivery");
  return { versionId, name: setName(item), words: `${item.shotCode} version ${item.number}` };
}
