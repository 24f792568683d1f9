import { eq, sql, type SQL } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import type { RenderState } from "@/db/enums";
import { deliveries, deliveryItems, receipts } from "@/db/schema/deliveries";
import { standingVerdicts, submissions } from "@/db/schema/reviews";
import { renders, versions } from "@/db/schema/versions";
import type { Standing } from "../shots/schema-standing";
import { standingOfVersion } from "../shots/standing";

/** The standing of each version that the condition chooses, the newest or not. */
export async function readStandings(
  db: Database | Transaction,
  chosen: SQL | undefined,
): Promise<Map<string, Standing>> {
  const judged = (kind: string) =>
    sql<number>`(select count(*)::int from ${standingVerdicts} x where x.version_id = ${versions.id} and x.kind = ${kind})`;
  const answered = (kind: string) =>
    sql<boolean>`exists (select 1 from ${deliveryItems} i join ${deliveries} d on d.id = i.delivery_id
      join ${receipts} q on q.delivery_id = d.id
      where i.version_id = ${versions.id} and d.withdrawn_at is null and q.kind = ${kind})`;
  const rows = await db
    .select({
      id: versions.id,
      versionNumber: versions.number,
      renderState: sql<RenderState>`${renders.state}`,
      sentAt: submissions.sentAt,
      frameCount: sql<number>`${versions.last} - ${versions.first} + 1`,
      returnedFrames: judged("returned"),
      signedFrames: judged("signed off"),
      delivered: sql<boolean>`exists (select 1 from ${deliveryItems} i join ${deliveries} d on d.id = i.delivery_id
        where i.version_id = ${versions.id} and d.published_at is not null and d.withdrawn_at is null)`,
      received: answered("received"),
      refused: answered("refused"),
    })
    .from(versions)
    .leftJoin(renders, eq(renders.versionId, versions.id))
    .leftJoin(submissions, eq(submissions.versionId, versions.id))
    .where(chosen);
  return new Map(rows.map(({ id, ...facts }) => [id, standingOfVersion(facts)]));
}
