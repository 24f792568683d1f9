import type { ColourSpace, Quality } from "@/lib/versions/schema";
import type { Setup } from "@/render/scene/setup";

/** What is chosen at *Render a version*, beside the setup itself. */
export interface RenderChoice {
  quality: Quality;
  colourSpace: ColourSpace;
  /** All the setup's frames, or a run of them. */
  frames: { first: number; last: number } | "all";
}

export const firstChoice: RenderChoice = { quality: "proof", colourSpace: "rec709", frames: "all" };

/** The frames meant: the chosen run as far as the setup has it. */
export function chosenFrames({ frames }: RenderChoice, { time }: Setup): { first: number; last: number } {
  return frames === "all" ? { first: time.first, last: time.last } : frames;
}
