import { desc, eq } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import { people } from "@/db/schema/people";
import { standingVerdicts, verdicts } from "@/db/schema/reviews";
import type { StandingRun } from "./schema";

/** The newest verdict given on a version, whatever it says; null when none was given. */
export async function findLatestVerdict(db: Database | Transaction, versionId: string) {
  const [row] = await db
    .select({ id: verdicts.id, kind: verdicts.kind, by: people.name, at: verdicts.givenAt })
    .from(verdicts)
    .innerJoin(people, eq(people.id, verdicts.givenBy))
    .where(eq(verdicts.versionId, versionId))
    .orderBy(desc(verdicts.givenAt), desc(verdicts.id))
    .limit(1);
  return row ?? null;
}

/** The version's frames on which a verdict stands, as runs of consecutive frames under the same verdict. */
export async function findRuns(db: Database | Transaction, versionId: string): Promise<StandingRun[]> {
  const rows = await db
    .select({
      frame: standingVerdicts.frame,
      verdictId: verdicts.id,
      kind: verdicts.kind,
      words: verdicts.words,
      givenBy: people.name,
      givenAt: verdicts.givenAt,
    })
    .from(standingVerdicts)
    .innerJoin(verdicts, eq(verdicts.id, standingVerdicts.verdictId))
    .innerJoin(people, eq(people.id, verdicts.givenBy))
    .where(eq(standingVerdicts.versionId, versionId))
    .orderBy(standingVerdicts.frame);

  const runs: StandingRun[] = [];
  for (const { frame, givenAt, ...rest } of rows) {
    const open = runs.at(-1);
    if (open && open.verdictId === rest.verdictId && open.last === frame - 1) open.last = frame;
    else runs.push({ ...rest, first: frame, last: frame, givenAt: givenAt.toISOString() });
  }
  return runs;
}
