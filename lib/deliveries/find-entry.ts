import { and, eq, sql } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import { deliveryDocuments, deliveryFiles } from "@/db/schema/deliveries";
import type { PackageEntry } from "./find-contents";

/** The file or text of a delivery with this path; undefined when it has none. */
export async function findEntry(
  db: Database | Transaction,
  deliveryId: string,
  path: string,
): Promise<PackageEntry | undefined> {
  const { sha256, bytes } = deliveryFiles;
  const [file] = await db
    .select({ path: deliveryFiles.path, sha256, bytes })
    .from(deliveryFiles)
    .where(and(eq(deliveryFiles.deliveryId, deliveryId), eq(deliveryFiles.path, path)));
  if (file) return file;
  const { body } = deliveryDocuments;
  const [text] = await db
    .select({
      path: deliveryDocuments.path,
      sha256: deliveryDocuments.sha256,
      body,
      bytes: sql<number>`octet_length(${body})`,
    })
    .from(deliveryDocuments)
    .where(and(eq(deliveryDocuments.deliveryId, deliveryId), eq(deliveryDocuments.path, path)));
  return text;
}
