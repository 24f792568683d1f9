import { desc, eq, sql } from "drizzle-orm";
import type { z } from "zod";
import type { Database } from "@/db/client";
import { people } from "@/db/schema/people";
import { frames, seals, versions } from "@/db/schema/versions";
import type { Ctx } from "../context";
import { findShot } from "../shots/find-shot";
import type { shotIdInput } from "../shots/schema";
import type { VersionLine } from "./schema";
import { readStandings } from "./version-facts";

/** A shot's versions, newest first. */
export async function listVersions(ctx: Ctx, input: z.infer<typeof shotIdInput>): Promise<VersionLine[]> {
  const shot = await findShot(ctx.db, ctx.actor, "version.see", input.shot);
  return readVersions(ctx.db, shot.id);
}

export async function readVersions(db: Database, shotId: string): Promise<VersionLine[]> {
  const ofShot = eq(versions.shotId, shotId);
  const finished = sql`(select count(*)::int from ${frames} f where f.version_id = ${versions.id})`;
  const firstFinished = sql`(select min(f.number) from ${frames} f where f.version_id = ${versions.id})`;
  const [rows, standings] = await Promise.all([
    db
      .select({
        version: versions,
        maker: people.name,
        digest: seals.digest,
        done: sql<number>`${finished}`,
        firstFinished: sql<number | null>`${firstFinished}`,
      })
      .from(versions)
      .innerJoin(people, eq(people.id, versions.madeBy))
      .leftJoin(seals, eq(seals.versionId, versions.id))
      .where(ofShot)
      .orderBy(desc(versions.number)),
    readStandings(db, ofShot),
  ]);
  return rows.map(({ version, maker, digest, done, firstFinished }) => ({
    id: version.id,
    number: version.number,
    standing: standings.get(version.id) ?? "stopped",
    quality: version.quality,
    colourSpace: version.colourSpace,
    first: version.first,
    last: version.last,
    madeAt: version.madeAt.toISOString(),
    maker,
    digest,
    done,
    firstFinished,
  }));
}
