import type { Database } from "@/db/client";
import type { RenderFrame } from "@/render/hosts/node/frame-request";
import { kernelVersion } from "@/render/kernel-version";
import { setupFromJson } from "@/render/scene/parse-setup";
import type { Setup } from "@/render/scene/setup";
import { announce } from "../events/record";
import { log } from "../log";
import type { Storage } from "../storage/stored-file";
import type { StopWatch } from "./cancellations";
import { failRender } from "./fail-render";
import { FrameFailure } from "./frame-failure";
import { readFramePlan, type FramePlan } from "./frame-plan";
import { isFrameKept, keepFrame } from "./keep-frame";
import type { FrameJob } from "./schema";
import { sealVersion } from "./seal-version";

/** What a job is done with. */
export interface Workshop {
  db: Database;
  store: Storage;
  renderFrame: RenderFrame;
  stops: StopWatch;
}

/**
 * Renders a job's frames and, after the version's last, seals it. Finished frames are skipped, so the job may be killed at
 * any moment and done again. Returns "later" when the worker is closing; throws only what another try may mend.
 */
export async function runFrameJob(shop: Workshop, job: FrameJob): Promise<"done" | "later"> {
  const stop = shop.stops.watch(job.versionId);
  let frame = job.first;
  try {
    for (; frame <= job.last; frame += 1) {
      const plan = await readFramePlan(shop.db, job);
      if (!plan) return "done";
      if (stop.signal.aborted) return stop.signal.reason === "closing" ? "later" : "done";
      await renderOne(shop, plan, frame, stop.signal);
    }
    await sealVersion(shop.db, job.versionId);
    return "done";
  } catch (error) {
    if (stop.signal.aborted) return stop.signal.reason === "closing" ? "later" : "done";
    if (!(error instanceof FrameFailure)) throw error;
    log.error({ err: error, ...job, frame }, "a frame failed");
    await failRender(shop.db, { ...job, frame, why: error.message });
    return "done";
  } finally {
    stop.release();
  }
}

async function renderOne(shop: Workshop, plan: FramePlan, frame: number, signal: AbortSignal): Promise<void> {
  if (await isFrameKept(shop.db, shop.store, plan.versionId, frame)) return;
  const setup = readSetup(plan);
  const { quality, colourSpace, setupDigest } = plan;
  const onProgress = progressTeller(shop.db, plan, frame);
  const request = { frame, quality, colourSpace, setupDigest, kernelVersion, signal, onProgress };
  const rendered = await shop.renderFrame(setup, request).catch((error: unknown) => {
    if (signal.aborted) throw error;
    throw new FrameFailure(asSentence(error), error);
  });
  await keepFrame(shop.db, shop.store, plan, frame, rendered);
}

/** The renderer's own words, as the sentence that people are shown. */
function asSentence(error: unknown): string {
  const words = error instanceof Error ? error.message : String(error);
  return /[.!?]$/.test(words) ? words : `${words}.`;
}

function readSetup(plan: FramePlan): Setup {
  if (plan.kernel !== kernelVersion)
    throw new FrameFailure(
      `The version was begun with kernel ${plan.kernel}, and this worker has ${kernelVersion}, which may give other pixels. ` +
        `Resume it where a worker has ${plan.kernel}, or render a new version.`,
    );
  const parsed = setupFromJson(plan.setup);
  if (parsed.ok) return parsed.value;
  throw new FrameFailure(`This build cannot read the frozen setup. ${parsed.problems[0]}`);
}

/** Tells open pages how much of a frame is done, at most once a second. */
function progressTeller(db: Database, plan: FramePlan, frame: number): (share: number) => void {
  let told = performance.now();
  return (share) => {
    if (performance.now() - told < 1000) return;
    told = performance.now();
    const { productionId, versionId, shotId } = plan;
    const percent = Math.floor(100 * share);
    announce(db, { kind: "frame.progress", productionId, versionId, shotId, frame, percent }).catch(
      () => undefined,
    );
  };
}
