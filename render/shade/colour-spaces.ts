// Linear colour spaces from their primaries. XYZ is CIE 1931 2°, relative; matrices are row-major, out = M · in.

export const colourSpaces = ["rec709", "acescg"] as const;
/** The working spaces a frame may be written in: linear Rec.709, or ACEScg (AP1). */
export type ColourSpace = (typeof colourSpaces)[number];

export type Matrix3 = readonly [Triple, Triple, Triple];
export type Triple = readonly [number, number, number];
type Chromaticity = readonly [number, number];

export interface Primaries {
  red: Chromaticity;
  green: Chromaticity;
  blue: Chromaticity;
  white: Chromaticity;
}

/** Chromaticities x, y: ITU-R BT.709-6 with D65; SMPTE ST 2065-1 (AP0); Academy S-2014-004 (AP1). */
export const primaries = {
  rec709: { red: [0.64, 0.33], green: [0.3, 0.6], blue: [0.15, 0.06], white: [0.3127, 0.329] },
  acescg: { red: [0.713, 0.293], green: [0.165, 0.83], blue: [0.128, 0.044], white: [0.32168, 0.33767] },
  ap0: { red: [0.7347, 0.2653], green: [0, 1], blue: [0.0001, -0.077], white: [0.32168, 0.33767] },
} as const satisfies Record<ColourSpace | "ap0", Primaries>;

const bradford: Matrix3 = [
  [0.8951, 0.2664, -0.1614],
  [-0.7502, 1.7135, 0.0367],
  [0.0389, -0.0685, 1.0296],
];

export function multiply(a: Matrix3, b: Matrix3): Matrix3 {
  const row = ([x, y, z]: Triple): Triple => [
    x * b[0][0] + y * b[1][0] + z * b[2][0],
    x * b[0][1] + y * b[1][1] + z * b[2][1],
    x * b[0][2] + y * b[1][2] + z * b[2][2],
  ];
  return [row(a[0]), row(a[1]), row(a[2])];
}

export function apply(m: Matrix3, [x, y, z]: Triple): Triple {
  const row = (r: Triple) => r[0] * x + r[1] * y + r[2] * z;
  return [row(m[0]), row(m[1]), row(m[2])];
}

export function invert([[a, b, c], [d, e, f], [g, h, i]]: Matrix3): Matrix3 {
  const A = e * i - f * h;
  const B = f * g - d * i;
  const C = d * h - e * g;
  const det = a * A + b * B + c * C;
  return [
    [A / det, (c * h - b * i) / det, (b * f - c * e) / det],
    [B / det, (a * i - c * g) / det, (c * d - a * f) / det],
    [C / det, (b * g - a * h) / det, (a * e - b * d) / det],
  ];
}

const whiteXyz = ([x, y]: Chromaticity): Triple => [x / y, 1, (1 - x - y) / y];

/** Normalised primary matrix, linear RGB → XYZ with white at Y = 1: P·diag(P⁻¹·w) (SMPTE RP 177:1993). */
export function rgbToXyz({ red, green, blue, white }: Primaries): Matrix3 {
  const z = ([x, y]: Chromaticity) => 1 - x - y;
  const p: Matrix3 = [
    [red[0], green[0], blue[0]],
    [red[1], green[1], blue[1]],
    [z(red), z(green), z(blue)],
  ];
  const [r, g, b] = apply(invert(p), whiteXyz(white));
  return multiply(p, [
    [r, 0, 0],
    [0, g, 0],
    [0, 0, b],
  ]);
}

/** XYZ seen under one white → XYZ seen under another: scaling in Bradford's cone responses (Lam 1985). */
export function adaptWhite(from: Chromaticity, to: Chromaticity): Matrix3 {
  const source = apply(bradford, whiteXyz(from));
  const target = apply(bradford, whiteXyz(to));
  const scale: Matrix3 = [
    [target[0] / source[0], 0, 0],
    [0, target[1] / source[1], 0],
    [0, 0, target[2] / source[2]],
  ];
  return multiply(invert(bradford), multiply(scale, bradford));
}

/** Linear RGB of one space → linear RGB of another; white maps to white. */
export function rgbToRgb(from: Primaries, to: Primaries): Matrix3 {
  const adapted = multiply(adaptWhite(from.white, to.white), rgbToXyz(from));
  return multiply(invert(rgbToXyz(to)), adapted);
}

/**
 * XYZ of light → working space. Light is taken as seen by an eye adapted to D65, as Rec.709 has it, so that both working
 * spaces show the same colours.
 */
export function xyzToWorking(space: ColourSpace): Matrix3 {
  const toRec709 = invert(rgbToXyz(primaries.rec709));
  return space === "rec709" ? toRec709 : multiply(rgbToRgb(primaries.rec709, primaries[space]), toRec709);
}
