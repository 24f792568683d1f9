// A tile: some whole rows of a frame, traced and shaded. The same bytes whatever the tiling, order or thread.
import type { FramePlan } from "./frame-plan";
import { sampleFates } from "./path-planes";
import { shadePlanes } from "./shade-planes";
import { tracePlanes } from "./trace-planes";

export interface Tile {
  /** Four floats a pixel, premultiplied, rows y0 to y1 (exclusive) from the top. */
  rgba: Float32Array;
  /** Light paths traced. */
  paths: number;
  /** Pixels (y·width + x) with a light path whose end could not be found. */
  unresolved: number[];
}

export function renderTile(plan: FramePlan, y0: number, y1: number): Tile {
  const planes = tracePlanes(plan, y0, y1);
  const { width } = plan.setup.picture;
  const unresolved = new Set<number>();
  let paths = 0;
  planes.fate.forEach((fate, i) => {
    if (fate !== sampleFates.outsideLens) paths++;
    if (fate !== sampleFates.unresolved) return;
    const x = Math.floor((i % planes.width) / plan.samples);
    const y = y0 + Math.floor(Math.floor(i / planes.width) / plan.samples);
    unresolved.add(y * width + x);
  });
  return { rgba: shadePlanes(plan, planes), paths, unresolved: [...unresolved] };
}
