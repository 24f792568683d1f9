import { eq } from "drizzle-orm";
import { alias } from "drizzle-orm/pg-core";
import type { z } from "zod";
import { people } from "@/db/schema/people";
import { productions, sequences } from "@/db/schema/productions";
import { setups, shots } from "@/db/schema/shots";
import { setupSchema } from "@/render/scene/setup";
import { may } from "../auth/authorize";
import type { Ctx } from "../context";
import { found, parseInput } from "../errors";
import { findShot } from "../shots/find-shot";
import type { shotIdInput } from "../shots/schema";
import { readVersions } from "../versions/list-versions";
import type { BenchPage } from "./schema";

const artist = alias(people, "artist");
const saver = alias(people, "saver");

/** A shot with its working setup and its versions, as the Bench shows it. */
export async function getSetup(ctx: Ctx, input: z.infer<typeof shotIdInput>): Promise<BenchPage> {
  const shot = await findShot(ctx.db, ctx.actor, "setup.see", input.shot);
  const [row] = await ctx.db
    .select({
      production: { id: productions.id, name: productions.name },
      sequence: sequences.name,
      artist: { id: artist.id, name: artist.name },
      setup: setups,
      saver: saver.name,
    })
    .from(shots)
    .innerJoin(setups, eq(setups.shotId, shots.id))
    .innerJoin(productions, eq(productions.id, shots.productionId))
    .innerJoin(sequences, eq(sequences.id, shots.sequenceId))
    .leftJoin(artist, eq(artist.id, shots.artistId))
    .leftJoin(saver, eq(saver.id, setups.savedBy))
    .where(eq(shots.id, shot.id));
  const facts = found(row, "shot");
  return {
    shot: { id: shot.id, code: shot.code, brief: shot.brief, hold: shot.hold, dueOn: shot.dueOn },
    production: facts.production,
    sequence: facts.sequence,
    artist: facts.artist,
    setup: parseInput(setupSchema, facts.setup.body),
    revision: facts.setup.revision,
    savedAt: facts.setup.savedAt.toISOString(),
    savedBy: facts.saver,
    versions: await readVersions(ctx.db, shot.id),
    reader: { id: ctx.actor.id, timeZone: ctx.actor.timeZone },
    may: {
      save: may(ctx.actor, "setup.save", shot.productionId),
      render: may(ctx.actor, "version.render", shot.productionId),
    },
  };
}
