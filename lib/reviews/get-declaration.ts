import type { z } from "zod";
import { setupFromJson } from "@/render/scene/parse-setup";
import { authorize, may } from "../auth/authorize";
import type { Ctx } from "../context";
import { describeSetup } from "./describe-setup";
import { findConcerned } from "./find-members";
import { findLatestVerdict, findRuns } from "./find-verdicts";
import { findVersion, type FoundVersion } from "./find-version";
import { findNewestNumber } from "./find-newest-number";
import { versionIdSchema } from "./schema";

/** All that the verdict's page shows: what would be signed, what stands, and whether the reader may judge. */
export async function getDeclaration(ctx: Ctx, input: z.infer<typeof versionIdSchema>) {
  const version = await findVersion(ctx.db, input.version);
  authorize(ctx.actor, "review.see", version.productionId);
  const [newest, latest, runs, told] = await Promise.all([
    findNewestNumber(ctx.db, version.shotId),
    findLatestVerdict(ctx.db, version.id),
    findRuns(ctx.db, version.id),
    findConcerned(ctx.db, version, ctx.actor.id),
  ]);
  const { id, number, production, productionId, productionCode, shotId, shotCode, brief, dueOn, maker } =
    version;
  const { kernel, quality, colourSpace, first, last, digest, bytes, setup, sentByName, sentWords } = version;
  return {
    ...{ id, number, production, productionId, productionCode, shotId, shotCode, brief, dueOn, maker },
    ...{ kernel, quality, colourSpace, first, last, digest, bytes, sentByName, sentWords },
    madeById: version.madeBy,
    sentAt: version.sentAt?.toISOString() ?? null,
    pictureSize: sizeOf(setup),
    setupFacts: sentencesOf(setup),
    newest,
    after: latest?.id ?? null,
    runs,
    told: told.map(({ name }) => name),
    reader: { name: ctx.actor.name, timeZone: ctx.actor.timeZone },
    obstacle: findObstacle(ctx, version, newest),
  };
}

export type DeclarationFacts = Awaited<ReturnType<typeof getDeclaration>>;

const sentencesOf = (text: string) => {
  const parsed = setupFromJson(text);
  return parsed.ok
    ? describeSetup(parsed.value)
    : ["This program cannot read the setup: it was frozen by another build."];
};

const sizeOf = (text: string) => {
  const parsed = setupFromJson(text);
  return parsed.ok ? { width: parsed.value.picture.width, height: parsed.value.picture.height } : null;
};

/** Why the reader cannot give a verdict on it now; null when they can. */
function findObstacle(ctx: Ctx, version: FoundVersion, newest: number): string | null {
  if (!may(ctx.actor, "verdict.give", version.productionId))
    return "Only this production's science advisor can give a verdict; you can read what stands here.";
  if (version.madeBy === ctx.actor.id)
    return "You made this version yourself: another advisor must give its verdict.";
  if (version.digest === null) return "Its frames are not all rendered, so it has no digest to sign.";
  if (version.sentAt === null) return "It has not been sent for review.";
  if (version.number !== newest)
    return `Version ${newest} of ${version.shotCode} is newer and governs: no verdict can be given on this one.`;
  return null;
}
