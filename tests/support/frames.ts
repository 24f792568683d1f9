// Versions whose frames are made without the renderer: small files with bytes of their own, kept and sealed as real ones are.
import { mkdtempSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { asc, eq } from "drizzle-orm";
import { outbox } from "@/db/schema/events";
import type { Ctx } from "@/lib/context";
import { getSetup } from "@/lib/setups/get-setup";
import { runFrameJob, type Workshop } from "@/lib/renders/run-frame-job";
import { frameJobSchema, type FrameJob } from "@/lib/renders/schema";
import { folderStorage } from "@/lib/storage/folder";
import { renderVersion } from "@/lib/versions/render-version";
import type { RenderFrame } from "@/render/hosts/node/frame-request";

/** Stands for the renderer where a test is about everything but pixels: bytes that follow from the request. */
export const quickFrame: RenderFrame = async (_setup, { frame, setupDigest, signal }) => {
  signal?.throwIfAborted();
  const text = (kind: string) => Buffer.from(`${kind} of frame ${frame} of ${setupDigest}`);
  return { png: text("png"), exr: text("exr"), stats: { seconds: 0.25, paths: 576, unresolved: 0 } };
};

/** What jobs are done with in a test; parts can be replaced. */
export function openWorkshop(db: Workshop["db"], parts: Partial<Workshop> = {}): Workshop {
  const store = folderStorage(mkdtempSync(join(tmpdir(), "ringwright-frames-")));
  const stops = { watch: () => ({ signal: new AbortController().signal, release: () => undefined }) };
  return { db, store, renderFrame: quickFrame, stops, ...parts };
}

/** Begins a version of the shot's present setup, of frames 1001 and 1002 unless told otherwise. */
export async function beginVersion(
  artist: Ctx,
  shot: string,
  change: { first?: number; last?: number } = {},
) {
  const { revision } = await getSetup(artist, { shot });
  const choice = { quality: "proof", colourSpace: "rec709", first: 1001, last: 1002, ...change } as const;
  return renderVersion(artist, { shot, revision, ...choice });
}

/** The jobs a version put into the outbox, in order. */
export async function jobsOf(db: Workshop["db"], versionId: string): Promise<FrameJob[]> {
  const rows = await db.select().from(outbox).where(eq(outbox.kind, "job")).orderBy(asc(outbox.createdAt));
  return rows
    .map(({ payload }) => frameJobSchema.parse(payload))
    .filter((job) => job.versionId === versionId);
}

/** A version that is whole and sealed. */
export async function sealedVersion(artist: Ctx, shot: string, workshop = openWorkshop(artist.db)) {
  const version = await beginVersion(artist, shot);
  for (const job of await jobsOf(artist.db, version.id)) await runFrameJob(workshop, job);
  return version;
}
