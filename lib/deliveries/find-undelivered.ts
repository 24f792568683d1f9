import { and, eq, inArray, sql } from "drizzle-orm";
import type { Database } from "@/db/client";
import { shotFacts } from "@/db/schema/facts";

/** The newest versions whose every frame is signed off, and which are in no delivery that stands. */
export async function findUndelivered(db: Database, productionIds: string[]): Promise<Set<string>> {
  const rows = await db
    .select({ versionId: shotFacts.versionId })
    .from(shotFacts)
    .where(
      and(
        inArray(shotFacts.productionId, productionIds),
        eq(shotFacts.hold, "none"),
        sql`${shotFacts.signedFrames} = ${shotFacts.frameCount}`,
        sql`not exists (select 1 from delivery_items i join deliveries d on d.id = i.delivery_id
          where i.version_id = ${shotFacts.versionId} and d.withdrawn_at is null and not delivery_stopped(d.id))`,
      ),
    );
  return new Set(rows.flatMap(({ versionId }) => (versionId ? [versionId] : [])));
}
