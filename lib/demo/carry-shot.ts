// Carries one demonstration shot to its standing, step by step; a step that was taken before is not taken again.
import { and, eq } from "drizzle-orm";
import { productions, sequences } from "@/db/schema/productions";
import { setups, shots } from "@/db/schema/shots";
import { renders, versions } from "@/db/schema/versions";
import { submissions } from "@/db/schema/reviews";
import { runFrameJob } from "../renders/run-frame-job";
import { sendForReview } from "../reviews/send-for-review";
import { saveSetup } from "../setups/save-setup";
import { changeShots } from "../shots/change-shots";
import { createSequence } from "../shots/create-sequence";
import { createShot } from "../shots/create-shot";
import { cancelVersion } from "../versions/cancel-version";
import { renderVersion } from "../versions/render-version";
import { resumeVersion } from "../versions/resume-version";
import { deliverShot } from "./deliver-shot";
import { judgeVersion } from "./judge-version";
import { as, type Stage, type VersionRow } from "./stage";
import type { StoryShot } from "./story";

const withoutVersion: StoryShot["fate"][] = ["open", "on hold", "omitted"];
const unsent: StoryShot["fate"][] = ["rendering", "stopped", "ready"];

export async function carryShot(stage: Stage, story: StoryShot): Promise<void> {
  const shotId = await findOrMakeShot(stage, story);
  if (story.fate === "on hold" || story.fate === "omitted") await holdShot(stage, shotId, story.fate);
  if (withoutVersion.includes(story.fate)) return;

  const version = await findOrRender(stage, story, shotId);
  await finishFrames(stage, story, version);
  if (unsent.includes(story.fate)) return;

  await sendOnce(stage, story, version.id);
  if (story.fate === "in review") return;
  const verdict = await judgeVersion(stage, story, version);
  if (story.fate === "returned" || story.fate === "signed off") return;
  await deliverShot(stage, story, version, verdict);
}

async function findOrMakeShot(stage: Stage, story: StoryShot): Promise<string> {
  const { db } = stage.shop;
  const [production] = await db.select().from(productions).where(eq(productions.code, stage.production.code));
  const [made] = await db
    .select()
    .from(shots)
    .where(and(eq(shots.productionId, production!.id), eq(shots.code, story.code)));
  const due = new Date(Date.now() + story.dueInDays * 86_400_000).toISOString().slice(0, 10);
  const artist = story.fate === "omitted" ? null : stage.studio.artist.id;
  const sequence = await findOrMakeSequence(stage, production!.id);
  const { code, brief } = story;
  const wanted = { production: production!.id, sequence, code, brief, dueOn: due, artist };
  const { id } = made ?? (await createShot(as(stage, "producer"), wanted));
  const [kept] = await db.select({ revision: setups.revision }).from(setups).where(eq(setups.shotId, id));
  if (kept!.revision === 1)
    await saveSetup(as(stage, "artist"), { shot: id, revision: 1, setup: story.setup });
  return id;
}

async function findOrMakeSequence(stage: Stage, productionId: string): Promise<string> {
  const { name } = stage.sequence;
  const [made] = await stage.shop.db
    .select()
    .from(sequences)
    .where(and(eq(sequences.productionId, productionId), eq(sequences.name, name)));
  return made?.id ?? (await createSequence(as(stage, "producer"), { production: productionId, name })).id;
}

async function holdShot(stage: Stage, shotId: string, hold: "on hold" | "omitted"): Promise<void> {
  const [shot] = await stage.shop.db.select().from(shots).where(eq(shots.id, shotId));
  if (shot!.hold !== hold)
    await changeShots(as(stage, "producer"), { shots: [shotId], change: { what: "hold", hold } });
}

async function findOrRender(stage: Stage, story: StoryShot, shotId: string): Promise<VersionRow> {
  const find = () => stage.shop.db.select().from(versions).where(eq(versions.shotId, shotId));
  const [made] = await find();
  if (made) return made;
  const { first, last } = story.setup.time;
  const [saved] = await stage.shop.db.select().from(setups).where(eq(setups.shotId, shotId));
  const choice = {
    quality: "proof",
    colourSpace: stage.production.kind === "film" ? "acescg" : "rec709",
  } as const;
  await renderVersion(as(stage, "artist"), {
    shot: shotId,
    revision: saved!.revision,
    first,
    last,
    ...choice,
  });
  return (await find())[0]!;
}

/** The frames of "rendering" are left to the worker, which begins when the studio opens. */
async function finishFrames(stage: Stage, { fate, code }: StoryShot, version: VersionRow): Promise<void> {
  if (fate === "rendering") return;
  const { id: versionId, first, last } = version;
  const read = async () => {
    const [render] = await stage.shop.db.select().from(renders).where(eq(renders.versionId, versionId));
    return render!;
  };
  if ((await read()).state === "failed") await resumeVersion(as(stage, "artist"), { version: versionId });
  const { state, attempt } = await read();
  if (state !== "rendering") return;
  await runFrameJob(stage.shop, { versionId, attempt, first, last: fate === "stopped" ? first + 1 : last });
  const { failure } = await read();
  if (failure) throw new Error(`${code} could not be rendered. ${failure}`);
  if (fate === "stopped") await cancelVersion(as(stage, "artist"), { version: versionId });
}

async function sendOnce(stage: Stage, { fate, words }: StoryShot, versionId: string): Promise<void> {
  const [sent] = await stage.shop.db.select().from(submissions).where(eq(submissions.versionId, versionId));
  const asked = fate === "in review" ? words : undefined;
  if (!sent)
    await sendForReview(as(stage, "artist"), {
      version: versionId,
      words: asked ?? "Ready for your verdict.",
    });
}
