import { asc, desc, eq, sql } from "drizzle-orm";
import type { Database } from "@/db/client";
import { frames, versions } from "@/db/schema/versions";

export interface Work {
  /** Machine time of all a shot's versions, by shot. */
  milliseconds: Map<string, number>;
  /** The first finished frame of the newest version that has one, by shot. */
  pictures: Map<string, { versionId: string; frame: number }>;
}

export async function readWork(db: Database, production: string): Promise<Work> {
  const ofProduction = eq(versions.productionId, production);
  const [spent, pictures] = await Promise.all([
    db
      .select({ shotId: versions.shotId, milliseconds: sql<number>`sum(${frames.milliseconds})::float8` })
      .from(frames)
      .innerJoin(versions, eq(versions.id, frames.versionId))
      .where(ofProduction)
      .groupBy(versions.shotId),
    db
      .selectDistinctOn([versions.shotId], {
        shotId: versions.shotId,
        versionId: versions.id,
        frame: frames.number,
      })
      .from(frames)
      .innerJoin(versions, eq(versions.id, frames.versionId))
      .where(ofProduction)
      .orderBy(versions.shotId, desc(versions.number), asc(frames.number)),
  ]);
  return {
    milliseconds: new Map(spent.map(({ shotId, milliseconds }) => [shotId, milliseconds])),
    pictures: new Map(pictures.map(({ shotId, ...picture }) => [shotId, picture])),
  };
}
