import { and, eq, inArray, sql } from "drizzle-orm";
import type { Database } from "@/db/client";
import { people } from "@/db/schema/people";
import { productions } from "@/db/schema/productions";
import { standingVerdicts, submissions } from "@/db/schema/reviews";
import { shots } from "@/db/schema/shots";
import { renders, seals, versions } from "@/db/schema/versions";
import { may, productionsWhere } from "../auth/authorize";
import type { Ctx } from "../context";
import { dateIn } from "../shots/today";
import { minutesForVersion } from "../today/reading-time";
import { sayWaiting } from "../today/waiting-words";

/** The newest versions that were sent and on which no frame is returned nor all are signed, oldest first. */
export async function listQueue(ctx: Ctx) {
  const rows = await findQueue(ctx.db, productionsWhere(ctx.actor, "review.see"));
  const now = new Date();
  const { timeZone } = ctx.actor;
  const items = rows.map(({ madeBy, sentAt, ...row }) => ({
    ...row,
    sentOn: dateIn(timeZone, sentAt),
    /** "two days", "since Wednesday". */
    waited: sayWaiting(sentAt, now, timeZone),
    minutes: minutesForVersion(row.last - row.first + 1),
    /** Whether the verdict is the reader's to give. */
    yours: may(ctx.actor, "verdict.give", row.productionId) && madeBy !== ctx.actor.id,
  }));
  return {
    items,
    today: dateIn(timeZone, now),
    judges: productionsWhere(ctx.actor, "verdict.give").length > 0,
  };
}

export type ReviewQueue = Awaited<ReturnType<typeof listQueue>>;
export type QueueItem = ReviewQueue["items"][number];

async function findQueue(db: Database, scope: string[]) {
  if (scope.length === 0) return [];
  return db
    .select({
      id: versions.id,
      number: versions.number,
      productionId: versions.productionId,
      production: productions.name,
      kind: productions.kind,
      shotId: shots.id,
      shotCode: shots.code,
      hold: shots.hold,
      dueOn: shots.dueOn,
      quality: versions.quality,
      first: versions.first,
      last: versions.last,
      madeBy: versions.madeBy,
      maker: people.name,
      digest: seals.digest,
      sentAt: submissions.sentAt,
      words: submissions.words,
      signed: countOf("signed off"),
      withdrawn: countOf("withdrawn"),
    })
    .from(submissions)
    .innerJoin(versions, eq(versions.id, submissions.versionId))
    .innerJoin(seals, eq(seals.versionId, versions.id))
    .innerJoin(renders, and(eq(renders.versionId, versions.id), eq(renders.state, "complete")))
    .innerJoin(shots, eq(shots.id, versions.shotId))
    .innerJoin(productions, eq(productions.id, versions.productionId))
    .innerJoin(people, eq(people.id, versions.madeBy))
    .where(and(inArray(versions.productionId, scope), isNewest, isUndecided))
    .orderBy(submissions.sentAt, versions.id);
}

const countOf = (kind: "signed off" | "withdrawn") =>
  sql<number>`(select count(*)::int from ${standingVerdicts} x where x.version_id = ${versions.id} and x.kind = ${kind})`;

const isNewest = sql`not exists (select 1 from ${versions} w where w.shot_id = ${versions.shotId} and w.number > ${versions.number})`;

const isUndecided = sql`not exists (select 1 from ${standingVerdicts} x where x.version_id = ${versions.id} and x.kind = 'returned')
  and (select count(*) from ${standingVerdicts} x where x.version_id = ${versions.id} and x.kind = 'signed off') <= ${versions.last} - ${versions.first}`;
