// One frame on all cores: tiles to the thread pool, then both files, also there, so that the caller's thread stays free.
import type { Setup } from "../../scene/setup";
import type { FrameRequest, RenderFrame } from "./frame-request";
import type { EncodeTask, TileResult, TileTask } from "./frame-thread";
import { threadPool, threads } from "./pool";
import { samplesPerAxis } from "../../shade/quality";

/** Light paths per tile: some hundredths of a second, which is how soon an abort is heeded. */
const pathsPerTile = 16_384;
/** Tracing's share of a frame's time, for progress; the rest is encoding. */
const tracingShare = 0.9;
/** More unresolved pixels than this fail a frame. */
const unresolvedAllowed = 1e-5;

/**
 * Renders one frame of a valid setup. The same setup, request and kernel give the same pixels however many threads there
 * are. Rejects with a whole sentence when the camera cannot be there or too many light paths end unresolved, and with the
 * signal's reason when aborted.
 */
export const renderFrame: RenderFrame = async (setup, request) => {
  const begun = performance.now();
  const { frame, colourSpace, setupDigest, kernelVersion, displayCurve = "none", signal } = request;
  const { width, height } = setup.picture;
  const pixels = new SharedArrayBuffer(16 * width * height);
  const { paths, unresolved } = await traceFrame(setup, request, pixels);
  if (unresolved.length > unresolvedAllowed * width * height)
    throw new Error(describeUnresolved(frame, width, unresolved));

  const task: EncodeTask = { setup, frame, colourSpace, setupDigest, kernelVersion, displayCurve, pixels };
  const encode = (name: "encodeExr" | "encodePng") => threadPool().run(task, { name }) as Promise<Uint8Array>;
  const [exr, png] = await Promise.all([encode("encodeExr"), encode("encodePng")]);
  signal?.throwIfAborted();
  request.onProgress?.(1);
  const seconds = (performance.now() - begun) / 1000;
  return { png, exr, stats: { seconds, paths, unresolved: unresolved.length } };
};

/** As many tiles at a time as there are threads, so that an abort leaves nothing queued. */
async function traceFrame(
  setup: Setup,
  request: FrameRequest,
  pixels: SharedArrayBuffer,
): Promise<TileResult> {
  const { frame, quality, colourSpace, signal, onProgress } = request;
  const { width, height } = setup.picture;
  const rows = Math.max(1, Math.floor(pathsPerTile / (width * samplesPerAxis[quality] ** 2)));
  const whole: TileResult = { paths: 0, unresolved: [] };
  let nextRow = 0;
  let rowsDone = 0;
  let failed = false;

  const lane = async () => {
    while (nextRow < height && !failed && !signal?.aborted) {
      const y0 = nextRow;
      const y1 = Math.min(height, y0 + rows);
      nextRow = y1;
      const task: TileTask = { setup, frame, quality, colourSpace, y0, y1, pixels };
      const { paths, unresolved } = (await threadPool().run(task, { name: "traceTile" })) as TileResult;
      whole.paths += paths;
      whole.unresolved.push(...unresolved);
      rowsDone += y1 - y0;
      onProgress?.((tracingShare * rowsDone) / height);
    }
  };
  const watched = () =>
    lane().catch((error: unknown) => {
      failed = true;
      throw error;
    });
  const lanes = await Promise.allSettled(Array.from({ length: threads }, watched));
  for (const ended of lanes) if (ended.status === "rejected") throw ended.reason;
  signal?.throwIfAborted();
  whole.unresolved.sort((a, b) => a - b);
  return whole;
}

function describeUnresolved(frame: number, width: number, pixels: number[]): string {
  const shown = pixels.slice(0, 20).map((pixel) => `(${pixel % width}, ${Math.floor(pixel / width)})`);
  const more = pixels.length > shown.length ? ` and ${pixels.length - shown.length} more` : "";
  return (
    `Frame ${frame} has ${pixels.length} pixels whose light paths end nowhere that could be found, too many to pass: ` +
    `${shown.join(" ")}${more}. Move the camera slightly, or report the setup.`
  );
}
