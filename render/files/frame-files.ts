// A finished frame as its two files: scene-linear OpenEXR for the work, sRGB PNG for the eye. No wall-clock dates.
import { canonicalJson } from "../scene/canonical";
import type { Setup } from "../scene/setup";
import { apply, primaries, rgbToRgb, rgbToXyz, type ColourSpace, type Triple } from "../shade/colour-spaces";
import { curveWhite, encodeSrgb, reinhardFactor, type DisplayCurve } from "../shade/transfer";
import { encodeExr, type ExrPicture } from "./exr";
import type { ExrHeader } from "./exr-attributes";
import { encodePng } from "./png";

export interface FrameFacts {
  setup: Setup;
  frame: number;
  colourSpace: ColourSpace;
  setupDigest: string;
  kernelVersion: string;
}

const largestHalf = 65504;
const comments =
  "Scene-linear. Luminance 1 is the disk's hottest radius seen unshifted, times the setup's exposure. " +
  "Alpha is 1 on the hole and the disk, 0 on the sky; colour is premultiplied, so stars add to what is behind.";

/** The frame's OpenEXR file: half-float RGBA in the frame's colour space. What half cannot hold is cut to 65504. */
export function frameExr(picture: ExrPicture, facts: FrameFacts): Uint8Array {
  const rgba = picture.rgba.map((value) => Math.max(-largestHalf, Math.min(largestHalf, value)));
  return encodeExr({ ...picture, rgba }, exrAttributes(facts));
}

function exrAttributes({ setup, frame, colourSpace, setupDigest, kernelVersion }: FrameFacts): ExrHeader {
  const { red, green, blue, white } = primaries[colourSpace];
  const { rate } = setup.time;
  return {
    chromaticities: { type: "chromaticities", value: [...red, ...green, ...blue, ...white] },
    comments: { type: "string", value: comments },
    ...(setup.camera.lens.kind === "panorama" && ({ envmap: { type: "envmap", value: 0 } } as const)),
    framesPerSecond: { type: "rational", value: [rate.numerator, rate.denominator] },
    imageCounter: { type: "int", value: frame },
    "ringwright:camera": { type: "string", value: canonicalJson(setup.camera) },
    "ringwright:kernel": { type: "string", value: kernelVersion },
    "ringwright:massSolar": { type: "double", value: setup.hole.massSolar },
    "ringwright:setupDigest": { type: "string", value: setupDigest },
    "ringwright:spin": { type: "double", value: setup.hole.spin },
  };
}

/**
 * The frame's PNG: 16-bit sRGB under a display curve. Colours outside the gamut or still brighter than white are cut;
 * alpha is left behind.
 */
export function framePng(picture: ExrPicture, colourSpace: ColourSpace, curve: DisplayCurve): Uint8Array {
  const { width, height, rgba } = picture;
  const toRec709 = colourSpace === "rec709" ? undefined : rgbToRgb(primaries[colourSpace], primaries.rec709);
  const luminance = rgbToXyz(primaries.rec709)[1];
  const codes = new Uint16Array(3 * width * height);
  for (let i = 0, at = 0; at < codes.length; i += 4, at += 3) {
    const colour: Triple = [rgba[i]!, rgba[i + 1]!, rgba[i + 2]!];
    const [r, g, b] = toRec709 ? apply(toRec709, colour) : colour;
    const factor =
      curve === "none"
        ? 1
        : reinhardFactor(Math.max(0, luminance[0] * r + luminance[1] * g + luminance[2] * b), curveWhite);
    codes[at] = code(factor * r);
    codes[at + 1] = code(factor * g);
    codes[at + 2] = code(factor * b);
  }
  return encodePng(width, height, codes);
}

const code = (linear: number) => Math.round(65535 * encodeSrgb(Math.max(0, Math.min(1, linear))));
