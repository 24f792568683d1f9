// What a frame is asked for with, and what comes back: the contract between the thread pool and its callers.
import type { Setup } from "../../scene/setup";
import type { ColourSpace } from "../../shade/colour-spaces";
import type { Quality } from "../../shade/quality";
import type { DisplayCurve } from "../../shade/transfer";

export interface FrameRequest {
  frame: number;
  quality: Quality;
  colourSpace: ColourSpace;
  /** SHA-256 (hexadecimal) of the canonical setup, written into the OpenEXR file. */
  setupDigest: string;
  kernelVersion: string;
  /** How the PNG shows light brighter than white; "none" unless said. The OpenEXR file never has a curve. */
  displayCurve?: DisplayCurve;
  /** Aborting stops the frame within a fraction of a second; renderFrame then rejects with the signal's reason. */
  signal?: AbortSignal;
  /** Told the share of the frame that is done, 0 to 1, never going back. */
  onProgress?: (share: number) => void;
}

export interface FrameStatistics {
  seconds: number;
  /** Light paths traced. */
  paths: number;
  /** Paths whose end could not be found; their pixels are black. */
  unresolved: number;
}

export interface RenderedFrame {
  /** 16-bit sRGB, for display. */
  png: Uint8Array;
  /** Scene-linear half-float RGBA in the asked colour space. */
  exr: Uint8Array;
  stats: FrameStatistics;
}

export type RenderFrame = (setup: Setup, request: FrameRequest) => Promise<RenderedFrame>;
