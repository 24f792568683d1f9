import { and, inArray, ne, sql, type SQL } from "drizzle-orm";
import type { z } from "zod";
import type { Transaction } from "@/db/client";
import type { Hold } from "@/db/enums";
import { shots } from "@/db/schema/shots";
import { authorize, productionsWhere } from "../auth/authorize";
import type { Ctx } from "../context";
import { DomainError } from "../errors";
import type { EventKind } from "../events/kinds";
import { recordEvent } from "../events/record";
import type { ShotRow } from "./find-shot";
import { requireArtist } from "./require-artist";
import type { changeShotsInput, ShotChange } from "./schema";

/** Changes one thing of one shot or of several; all of them or none. */
export async function changeShots(
  ctx: Ctx,
  { shots: ids, change }: z.infer<typeof changeShotsInput>,
): Promise<{ changed: number }> {
  return ctx.db.transaction(async (tx) => {
    const chosen = await chooseShots(ctx, tx, ids);
    const productionIds = new Set(chosen.map(({ productionId }) => productionId));
    for (const id of productionIds) authorize(ctx.actor, "shot.change", id);
    if (change.what === "artist" && change.artist)
      for (const id of productionIds) await requireArtist(tx, id, change.artist);

    const { set, differs } = columnOf(change);
    const changed = await tx
      .update(shots)
      .set(set)
      .where(and(inArray(shots.id, ids), differs))
      .returning();
    if (changed.length === 0) throw new DomainError("conflict", unchangedWords(chosen, change));
    for (const shot of changed.toSorted((a, b) => (a.code < b.code ? -1 : 1)))
      await record(tx, ctx, shot, change);
    return { changed: changed.length };
  });
}

async function chooseShots(ctx: Ctx, tx: Transaction, ids: string[]): Promise<ShotRow[]> {
  const seen = productionsWhere(ctx.actor, "shot.see");
  const chosen = await tx
    .select()
    .from(shots)
    .where(and(inArray(shots.id, ids), inArray(shots.productionId, seen)));
  if (chosen.length === new Set(ids).size) return chosen;
  const which = ids.length === 1 ? "There is no such shot" : "One of these shots does not exist";
  throw new DomainError("not-found", `${which}, or it is not yours to see.`);
}

function columnOf(change: ShotChange): { set: Partial<ShotRow>; differs: SQL | undefined } {
  if (change.what === "due")
    return { set: { dueOn: change.dueOn }, differs: sql`${shots.dueOn} is distinct from ${change.dueOn}` };
  if (change.what === "artist")
    return {
      set: { artistId: change.artist },
      differs: sql`${shots.artistId} is distinct from ${change.artist}`,
    };
  if (change.what === "brief")
    return { set: { brief: change.brief }, differs: ne(shots.brief, change.brief) };
  return { set: { hold: change.hold }, differs: ne(shots.hold, change.hold) };
}

const holdWords: Record<Hold, string> = {
  none: "not on hold",
  "on hold": "on hold already",
  omitted: "omitted already",
};

function unchangedWords(chosen: ShotRow[], change: ShotChange): string {
  const codes = chosen.length === 1 ? `${chosen[0]!.code} is` : "These shots are";
  const how = change.what === "hold" ? holdWords[change.hold] : "so already";
  return `${codes} ${how}: someone may have been quicker. Nothing was changed.`;
}

const holdKinds: Record<Hold, EventKind> = {
  none: "shot.released",
  "on hold": "shot.held",
  omitted: "shot.omitted",
};

const changeWords = { due: "the due date", artist: "the artist", brief: "the brief" } as const;

async function record(tx: Transaction, ctx: Ctx, shot: ShotRow, change: ShotChange): Promise<void> {
  await recordEvent(tx, {
    productionId: shot.productionId,
    actorId: ctx.actor.id,
    kind: change.what === "hold" ? holdKinds[change.hold] : "shot.changed",
    subject: {
      by: ctx.actor.name,
      shotId: shot.id,
      shot: shot.code,
      ...(change.what !== "hold" && { what: changeWords[change.what] }),
    },
  });
}
