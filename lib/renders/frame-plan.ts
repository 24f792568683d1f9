import { and, eq } from "drizzle-orm";
import type { Database } from "@/db/client";
import { renders, versions } from "@/db/schema/versions";
import type { ColourSpace, Quality } from "@/db/enums";
import type { FrameJob } from "./schema";

/** What a job's frames are rendered from: the frozen version, for one attempt at it. */
export interface FramePlan {
  versionId: string;
  productionId: string;
  shotId: string;
  attempt: number;
  /** Canonical JSON, as it was frozen. */
  setup: string;
  setupDigest: string;
  kernel: string;
  quality: Quality;
  colourSpace: ColourSpace;
  first: number;
  last: number;
}

/** The plan of a job, or nothing when the render was cancelled, failed, resumed anew or completed since it was queued. */
export async function readFramePlan(db: Database, job: FrameJob): Promise<FramePlan | undefined> {
  const [row] = await db
    .select({ version: versions, attempt: renders.attempt })
    .from(renders)
    .innerJoin(versions, eq(versions.id, renders.versionId))
    .where(
      and(
        eq(renders.versionId, job.versionId),
        eq(renders.attempt, job.attempt),
        eq(renders.state, "rendering"),
      ),
    );
  if (!row) return undefined;
  const { id, productionId, shotId, setup, setupDigest, kernel, quality, colourSpace, first, last } =
    row.version;
  return {
    versionId: id,
    productionId,
    shotId,
    attempt: row.attempt,
    setup,
    setupDigest,
    kernel,
    quality,
    colourSpace,
    first,
    last,
  };
}
