import { and, eq, getViewSelectedFields, inArray, ne } from "drizzle-orm";
import type { Database } from "@/db/client";
import { shotFacts } from "@/db/schema/facts";
import { people } from "@/db/schema/people";
import { productions } from "@/db/schema/productions";
import { shots } from "@/db/schema/shots";
import { renders, versions } from "@/db/schema/versions";
import { standingOf } from "../shots/standing";
import type { TodayItem } from "./schema";

/** The productions' shots that are not omitted, with their newest version and how they stand. */
export async function findShots(db: Database, productionIds: string[]) {
  if (productionIds.length === 0) return [];
  const rows = await db
    .select({
      id: shots.id,
      code: shots.code,
      brief: shots.brief,
      dueOn: shots.dueOn,
      artistId: shots.artistId,
      artist: people.name,
      productionId: shots.productionId,
      kind: productions.kind,
      facts: getViewSelectedFields(shotFacts),
      first: versions.first,
      last: versions.last,
      failedFrame: renders.failedFrame,
      failure: renders.failure,
    })
    .from(shots)
    .innerJoin(shotFacts, eq(shotFacts.shotId, shots.id))
    .innerJoin(productions, eq(productions.id, shots.productionId))
    .leftJoin(people, eq(people.id, shots.artistId))
    .leftJoin(versions, eq(versions.id, shotFacts.versionId))
    .leftJoin(renders, eq(renders.versionId, shotFacts.versionId))
    .where(and(inArray(shots.productionId, productionIds), ne(shots.hold, "omitted")))
    .orderBy(shots.code);
  return rows.map((row) => ({ ...row, standing: standingOf(row.facts) }));
}

export type TodayShot = Awaited<ReturnType<typeof findShots>>[number];

/** A look at the newest version's middle frame, once it is whole. */
export function pictureOf(shot: TodayShot): TodayItem["picture"] {
  const { versionId, renderState } = shot.facts;
  if (versionId === null || shot.first === null || shot.last === null || renderState !== "complete")
    return null;
  return { versionId, frame: Math.floor((shot.first + shot.last) / 2), square: shot.kind === "dome" };
}
