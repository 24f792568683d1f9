import { eq } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import { shots } from "@/db/schema/shots";
import { versions } from "@/db/schema/versions";
import { found } from "../errors";
import { nameFrames } from "./frame-names";

/** What an event's or a letter's sentence needs to know of a version. */
export interface NamedVersion {
  id: string;
  productionId: string;
  shotId: string;
  shot: string;
  number: number;
  /** As in "frames 1001–1024". */
  frames: string;
  first: number;
  last: number;
  madeBy: string;
}

export async function nameVersion(db: Database | Transaction, versionId: string): Promise<NamedVersion> {
  const [row] = await db
    .select({
      id: versions.id,
      productionId: versions.productionId,
      shotId: versions.shotId,
      shot: shots.code,
      number: versions.number,
      first: versions.first,
      last: versions.last,
      madeBy: versions.madeBy,
    })
    .from(versions)
    .innerJoin(shots, eq(shots.id, versions.shotId))
    .where(eq(versions.id, versionId));
  const version = found(row, "version");
  return { ...version, frames: nameFrames(version.first, version.last) };
}
