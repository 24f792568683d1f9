import { and, desc, eq } from "drizzle-orm";
import type { z } from "zod";
import { downloads, receipts } from "@/db/schema/deliveries";
import type { Ctx } from "../context";
import { scienceNotePath } from "./compose-documents";
import { findDoor } from "./find-door";
import { findEntry } from "./find-entry";
import { findSets, findTexts } from "./find-sets";
import { packageName } from "./lay-out";
import { deliveryIdSchema } from "./schema";
import { cautions } from "./science-words";
import { summariseNote } from "./summarise-note";

/** A client's page of one delivery. A door that is not open says why, and shows nothing of what lies behind it. */
export async function getDoor(ctx: Ctx, input: z.infer<typeof deliveryIdSchema>) {
  const { delivery, state } = await findDoor(ctx, "door.open", input.delivery);
  return {
    id: delivery.id,
    number: delivery.number,
    title: delivery.title,
    production: delivery.production,
    reader: { name: ctx.actor.name, timeZone: ctx.actor.timeZone },
    state,
    receipt: await findReceipt(ctx, delivery.id),
    manifestDigest: delivery.manifestDigest ?? "",
    contents: state.kind === "open" ? await findBehind(ctx, delivery) : null,
  };
}

export type DoorPage = Awaited<ReturnType<typeof getDoor>>;

async function findBehind(
  ctx: Ctx,
  delivery: { id: string; number: number; productionCode: string; words: string; bytes: number },
) {
  const [sets, texts, note, taken] = await Promise.all([
    findSets(ctx.db, delivery.id),
    findTexts(ctx.db, delivery.id),
    findEntry(ctx.db, delivery.id, scienceNotePath),
    findTaken(ctx, delivery.id),
  ]);
  return {
    words: delivery.words,
    bytes: delivery.bytes,
    files: texts.length + sets.reduce((sum, { files }) => sum + files, 0),
    folder: packageName(delivery.productionCode, delivery.number),
    sets,
    texts,
    summary: summariseNote(sets),
    note: note?.body ?? "",
    caution: cautions[0]!,
    taken,
  };
}

async function findReceipt(ctx: Ctx, deliveryId: string) {
  const [row] = await ctx.db
    .select({
      kind: receipts.kind,
      words: receipts.words,
      statement: receipts.statement,
      signedAt: receipts.signedAt,
    })
    .from(receipts)
    .where(and(eq(receipts.deliveryId, deliveryId), eq(receipts.personId, ctx.actor.id)));
  return row ? { ...row, signedAt: row.signedAt.toISOString() } : null;
}

async function findTaken(ctx: Ctx, deliveryId: string) {
  const rows = await ctx.db
    .select({ what: downloads.what, startedAt: downloads.startedAt, finishedAt: downloads.finishedAt })
    .from(downloads)
    .where(and(eq(downloads.deliveryId, deliveryId), eq(downloads.personId, ctx.actor.id)))
    .orderBy(desc(downloads.startedAt))
    .limit(200);
  return rows.map(({ what, startedAt, finishedAt }) => ({
    what,
    startedAt: startedAt.toISOString(),
    finishedAt: finishedAt?.toISOString() ?? null,
  }));
}
