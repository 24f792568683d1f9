import { createHash } from "node:crypto";
import { eq, sql } from "drizzle-orm";
import type { z } from "zod";
import type { Transaction } from "@/db/client";
import { setups, shots } from "@/db/schema/shots";
import { renders, versions } from "@/db/schema/versions";
import { kernelVersion } from "@/render/kernel-version";
import { canonicalJson } from "@/render/scene/canonical";
import { setupSchema, type Setup } from "@/render/scene/setup";
import type { Ctx } from "../context";
import { DomainError, found, parseInput } from "../errors";
import { recordEvent } from "../events/record";
import { queueFrames } from "../renders/queue-frames";
import { findShot, type ShotRow } from "../shots/find-shot";
import { nameFrames } from "./frame-names";
import type { RenderVersionInput, renderVersionInput } from "./schema";

/** The channels a frame has in this build: the picture alone. */
const channels = "RGBA half";

/** Freezes the shot's setup as its next version and queues the frames. */
export async function renderVersion(
  ctx: Ctx,
  input: z.infer<typeof renderVersionInput>,
): Promise<{ id: string; number: number }> {
  const { productionId } = await findShot(ctx.db, ctx.actor, "version.render", input.shot);
  return ctx.db.transaction(async (tx) => {
    // The shot's row is held until the end, so that two people get two numbers, one after the other.
    const [row] = await tx.select().from(shots).where(eq(shots.id, input.shot)).for("update");
    const shot = found(row, "shot");
    refuseHeld(shot);
    const setup = await readSetup(tx, input);
    const version = await insertVersion(tx, ctx.actor.id, shot, setup, input);
    await tx.insert(renders).values({ versionId: version.id });
    const count = input.last - input.first + 1;
    const numbers = Array.from({ length: count }, (_, index) => input.first + index);
    await queueFrames(tx, version.id, 1, numbers);
    await recordEvent(tx, {
      productionId,
      actorId: ctx.actor.id,
      kind: "version.made",
      subject: {
        by: ctx.actor.name,
        versionId: version.id,
        shotId: shot.id,
        version: version.number,
        shot: shot.code,
        frames: nameFrames(input.first, input.last),
        quality: input.quality,
      },
    });
    return version;
  });
}

function refuseHeld({ code, hold }: ShotRow): void {
  if (hold === "none") return;
  const state = hold === "on hold" ? "on hold" : "marked omitted";
  throw new DomainError(
    "conflict",
    `${code} is ${state}, so nothing new is rendered. A producer can take it up again.`,
  );
}

async function readSetup(
  tx: Transaction,
  { shot, revision, first, last }: RenderVersionInput,
): Promise<Setup> {
  const [row] = await tx.select().from(setups).where(eq(setups.shotId, shot));
  const saved = found(row, "setup");
  if (saved.revision !== revision)
    throw new DomainError(
      "conflict",
      "The setup was saved by someone else since you opened it, so nothing was rendered. Look at it again first.",
    );
  const setup = parseInput(setupSchema, saved.body);
  if (first < setup.time.first || last > setup.time.last)
    throw new DomainError(
      "invalid",
      `The setup has ${nameFrames(setup.time.first, setup.time.last)}; choose frames among those.`,
      first < setup.time.first ? "first" : "last",
    );
  return setup;
}

async function insertVersion(
  tx: Transaction,
  madeBy: string,
  shot: ShotRow,
  setup: Setup,
  { quality, colourSpace, first, last }: RenderVersionInput,
): Promise<{ id: string; number: number }> {
  const text = canonicalJson(setup);
  const setupDigest = createHash("sha256").update(text, "utf8").digest("hex");
  const [version] = await tx
    .insert(versions)
    .values({
      productionId: shot.productionId,
      shotId: shot.id,
      number: sql<number>`(select coalesce(max(v.number), 0) + 1 from versions v where v.shot_id = ${shot.id})`,
      setup: text,
      setupDigest,
      kernel: kernelVersion,
      quality,
      colourSpace,
      channels,
      first,
      last,
      madeBy,
    })
    .returning({ id: versions.id, number: versions.number });
  return version!;
}
