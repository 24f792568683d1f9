// `frame setup.json --out DIR`: a setup's frames as files, no server or database needed.
import { createHash } from "node:crypto";
import { mkdir, readFile, rename, rm, writeFile } from "node:fs/promises";
import path from "node:path";
import { frameDigits, frameName } from "../../files/frame-names";
import { kernelVersion } from "../../kernel-version";
import { canonicalJson } from "../../scene/canonical";
import { setupFromJson } from "../../scene/parse-setup";
import type { Setup } from "../../scene/setup";
import type { ColourSpace } from "../../shade/colour-spaces";
import type { Quality } from "../../shade/quality";
import type { DisplayCurve } from "../../shade/transfer";
import { renderFrame } from "../node/render-frame";
import { frameRange } from "./frame-range";
import { Refusal } from "./refusal";

export interface FrameCommand {
  setupFile: string;
  out: string;
  frames?: string;
  quality: Quality;
  colourSpace: ColourSpace;
  displayCurve: DisplayCurve;
  signal: AbortSignal;
  /** Told what is being done, in a short line that the next one replaces. */
  report: (line: string) => void;
}

/** Renders every asked frame to DIR as PNG and OpenEXR. A file appears only once it is whole. */
export async function renderFrames(command: FrameCommand): Promise<void> {
  const setup = await readSetup(command.setupFile);
  const frames = frameRange(command.frames, setup.time);
  await makeFolder(command.out);
  const setupDigest = createHash("sha256").update(canonicalJson(setup)).digest("hex");
  const { quality, colourSpace, displayCurve, signal, report } = command;

  for (const [done, frame] of frames.entries()) {
    const onProgress = (share: number) =>
      report(`frame ${frame}, ${done + 1} of ${frames.length}: ${Math.floor(100 * share)} %`);
    const asked = {
      frame,
      quality,
      colourSpace,
      displayCurve,
      setupDigest,
      kernelVersion,
      signal,
      onProgress,
    };
    const { png, exr, stats } = await renderFrame(setup, asked);
    const name = (extension: "png" | "exr") =>
      path.join(command.out, frameName("frame", frame, frameDigits(setup), extension));
    await writeWhole(name("exr"), exr);
    await writeWhole(name("png"), png);
    report(`frame ${frame}, ${done + 1} of ${frames.length}: ${stats.seconds.toFixed(1)} s`);
  }
}

async function readSetup(file: string): Promise<Setup> {
  const text = await readFile(file, "utf8").catch((error: NodeJS.ErrnoException) => {
    throw new Refusal([
      `${file}: The setup cannot be read (${error.code ?? error.message}). Check the path.`,
    ]);
  });
  const parsed = setupFromJson(text);
  if (!parsed.ok) throw new Refusal(parsed.problems.map((problem) => `${file}: ${problem}`));
  return parsed.value;
}

async function makeFolder(folder: string): Promise<void> {
  await mkdir(folder, { recursive: true }).catch((error: NodeJS.ErrnoException) => {
    throw new Refusal([`--out ${folder}: The folder cannot be made (${error.code ?? error.message}).`]);
  });
}

async function writeWhole(file: string, bytes: Uint8Array): Promise<void> {
  const partial = `${file}.${process.pid}.partial`;
  try {
    await writeFile(partial, bytes);
    await rename(partial, file);
  } catch (error) {
    await rm(partial, { force: true });
    const reason = error instanceof Error ? error.message : String(error);
    throw new Refusal([`${file}: The file cannot be written (${reason}). Nothing half-written is left.`]);
  }
}
