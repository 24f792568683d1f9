// Names of numbered frames: ASCII, no spaces, padded so that they sort as text (FIELD §1 G9; IMERSA draft for domes).
import type { Setup } from "../scene/setup";

/** Digits of a frame number: four for film, five for a dome, more where the last frame needs them (common practice). */
export function frameDigits({ camera, time }: Pick<Setup, "camera" | "time">): number {
  return Math.max(camera.lens.kind === "dome" ? 5 : 4, String(time.last).length);
}

/** A frame's file name, such as LH-020_1001.exr. The stem must be plain: letters, digits, dot, hyphen, underscore. */
export function frameName(stem: string, frame: number, digits: number, extension: "png" | "exr"): string {
  if (!/^[A-Za-z0-9][A-Za-z0-9._-]*$/.test(stem)) throw new RangeError(`“${stem}” is no plain file name.`);
  if (!Number.isInteger(frame) || frame < 0 || String(frame).length > digits)
    throw new RangeError(`Frame ${frame} does not fit ${digits} digits.`);
  return `${stem}_${String(frame).padStart(digits, "0")}.${extension}`;
}
