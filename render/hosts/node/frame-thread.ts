// What a pool thread does: trace and shade rows into the frame's shared memory, then encode the finished frame.
import { readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { frameExr, framePng, type FrameFacts } from "../../files/frame-files";
import { canonicalJson } from "../../scene/canonical";
import type { Setup } from "../../scene/setup";
import type { ColourSpace } from "../../shade/colour-spaces";
import { planFrame, type FramePlan } from "../../shade/frame-plan";
import type { Quality } from "../../shade/quality";
import type { DisplayCurve } from "../../shade/transfer";
import { renderTile } from "../../shade/render-tile";
import { decodeCatalogue, type Star } from "../../sky/catalogue";

export interface TileTask {
  setup: Setup;
  frame: number;
  quality: Quality;
  colourSpace: ColourSpace;
  y0: number;
  y1: number;
  /** The whole frame's RGBA, written by all threads, each its own rows. */
  pixels: SharedArrayBuffer;
}

export interface TileResult {
  paths: number;
  unresolved: number[];
}

export interface EncodeTask extends FrameFacts {
  displayCurve: DisplayCurve;
  pixels: SharedArrayBuffer;
}

let catalogue: Star[] | undefined;

function starCatalogue(): Star[] {
  const file = fileURLToPath(new URL("../../../public/sky/stars.bin", import.meta.url));
  try {
    catalogue ??= decodeCatalogue(readFileSync(file));
    return catalogue;
  } catch (error) {
    const reason = error instanceof Error ? error.message : String(error);
    throw new Error(`The star catalogue cannot be read (${reason}). Make it with: npm run build:sky`);
  }
}

// Frames in hand keep their plans: their other tiles will be asked for next.
const plans = new Map<string, FramePlan>();
const plansKept = 4;

function planOf({ setup, frame, quality, colourSpace }: TileTask): FramePlan {
  const key = canonicalJson([setup, frame, quality, colourSpace]);
  const known = plans.get(key);
  if (known) return known;
  const stars = setup.sky.kind === "stars" ? starCatalogue() : null;
  const plan = planFrame(setup, frame, quality, colourSpace, stars);
  for (const oldest of plans.keys()) if (plans.size >= plansKept) plans.delete(oldest);
  plans.set(key, plan);
  return plan;
}

export function traceTile(task: TileTask): TileResult {
  const { rgba, paths, unresolved } = renderTile(planOf(task), task.y0, task.y1);
  new Float32Array(task.pixels).set(rgba, 4 * task.y0 * task.setup.picture.width);
  return { paths, unresolved };
}

const pictureOf = ({ setup, pixels }: EncodeTask) => ({
  width: setup.picture.width,
  height: setup.picture.height,
  rgba: new Float32Array(pixels),
});

export const encodeExr = (task: EncodeTask): Uint8Array => frameExr(pictureOf(task), task);
export const encodePng = (task: EncodeTask): Uint8Array =>
  framePng(pictureOf(task), task.colourSpace, task.displayCurve);
