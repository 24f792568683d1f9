import { asc, eq, inArray } from "drizzle-orm";
import type { z } from "zod";
import type { Database } from "@/db/client";
import { shotFacts } from "@/db/schema/facts";
import { productions, sequences } from "@/db/schema/productions";
import { shots } from "@/db/schema/shots";
import { authorize, may, productionsWhere } from "../auth/authorize";
import type { Ctx } from "../context";
import { DomainError, found } from "../errors";
import { asksForWork, isLate, orderShots } from "./arrange-shots";
import { findHolders } from "./find-holders";
import { readWork } from "./read-work";
import type { listShotsInput, ShotGroup, ShotLine, ShotList } from "./schema";
import { standingOf } from "./standing";
import { dateIn } from "./today";

/** A production's shots with what stands where: filtered, in order, and counted. */
export async function listShots(ctx: Ctx, input: z.input<typeof listShotsInput>): Promise<ShotList> {
  const scope = productionsWhere(ctx.actor, "shot.see");
  const production = input.production ?? scope[0];
  if (production === undefined)
    throw new DomainError("not-found", "You belong to no production whose shots you may see.");
  authorize(ctx.actor, "shot.see", production);

  const all = await ctx.db
    .select()
    .from(productions)
    .where(inArray(productions.id, scope))
    .orderBy(asc(productions.code));
  const chosen = found(
    all.find(({ id }) => id === production),
    "production",
  );
  const today = dateIn(ctx.actor.timeZone);
  const { lines, groups, people } = await readLines(ctx.db, production);
  const shown = lines.filter((line) => matches(line, input));
  return {
    production: { id: chosen.id, code: chosen.code, name: chosen.name },
    productions: all.map(({ id, name }) => ({ id, name })),
    today,
    groups: arrange(groups, lines, shown, input.order ?? "sequence"),
    sequences: groups.map(({ id, number, name }) => ({ id, number, name })),
    totals: {
      shots: lines.length,
      asking: lines.filter(asksForWork).length,
      late: lines.filter((line) => isLate(line, today)).length,
      milliseconds: lines.reduce((sum, { milliseconds }) => sum + milliseconds, 0),
    },
    holders: people.everyone,
    artists: people.artists,
    mayChange: may(ctx.actor, "shot.change", production),
  };
}

type PlacedLine = ShotLine & { sequenceId: string };

async function readLines(db: Database, production: string) {
  const [rows, groups] = await Promise.all([
    db
      .select()
      .from(shots)
      .innerJoin(shotFacts, eq(shotFacts.shotId, shots.id))
      .where(eq(shots.productionId, production))
      .orderBy(asc(shots.code)),
    db.select().from(sequences).where(eq(sequences.productionId, production)).orderBy(asc(sequences.number)),
  ]);
  const [work, people] = await Promise.all([
    readWork(db, production),
    findHolders(
      db,
      production,
      rows.flatMap(({ shot_facts: facts }) => facts.versionId ?? []),
    ),
  ]);
  const lines = rows.map(({ shots: shot, shot_facts: facts }): PlacedLine => {
    const standing = standingOf(facts);
    const { versionId: id, versionNumber: number } = facts;
    return {
      id: shot.id,
      sequenceId: shot.sequenceId,
      code: shot.code,
      brief: shot.brief,
      standing,
      version: id !== null && number !== null ? { id, number } : null,
      picture: work.pictures.get(shot.id) ?? null,
      holder: people.holderOf(standing, shot.artistId, facts.versionId),
      dueOn: shot.dueOn,
      milliseconds: work.milliseconds.get(shot.id) ?? 0,
    };
  });
  return { lines, groups, people };
}

function matches({ standing, holder }: ShotLine, wanted: z.input<typeof listShotsInput>): boolean {
  if (wanted.standing && standing !== wanted.standing) return false;
  if (!wanted.holder) return true;
  return holder.kind === "person" ? holder.id === wanted.holder : holder.kind === wanted.holder;
}

function arrange(
  groups: { id: string; number: number; name: string }[],
  lines: PlacedLine[],
  shown: PlacedLine[],
  order: NonNullable<z.input<typeof listShotsInput>["order"]>,
): ShotGroup[] {
  if (order !== "sequence")
    return [{ id: "all", number: 0, name: "", shotCount: lines.length, shots: orderShots(shown, order) }];
  return groups.map(({ id, number, name }) => ({
    id,
    number,
    name,
    shotCount: lines.filter(({ sequenceId }) => sequenceId === id).length,
    shots: shown.filter(({ sequenceId }) => sequenceId === id),
  }));
}
