// From scene-linear light to what a screen is sent.

export const displayCurves = ["none", "reinhard"] as const;
/** How a PNG shows light brighter than white: cut, or compressed so that 16 times white is still shown. */
export type DisplayCurve = (typeof displayCurves)[number];

/** The luminance that the compressing curve shows as white. */
export const curveWhite = 16;

/**
 * sRGB encoding of a linear value (IEC 61966-2-1): 12.92 L up to 0.0031308, then 1.055 L^(1/2.4) − 0.055.
 * Values outside 0 to 1 are the caller's to clamp.
 */
export function encodeSrgb(linear: number): number {
  return linear <= 0.0031308 ? 12.92 * linear : 1.055 * linear ** (1 / 2.4) - 0.055;
}

/**
 * Extended Reinhard on luminance (Reinhard et al. 2002, eq. 4): the factor (1 + L/L_white²)/(1 + L) that a colour of
 * luminance L is multiplied with, so that L_white becomes 1 and hue is kept. L ≥ 0, L_white > 0.
 */
export function reinhardFactor(luminance: number, white: number): number {
  return (1 + luminance / (white * white)) / (1 + luminance);
}
