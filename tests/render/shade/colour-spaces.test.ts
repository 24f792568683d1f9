import { describe, expect, it } from "vitest";
import { sumBlackBody } from "@/render/shade/black-body-colour";
import { apply, primaries, rgbToRgb, xyzToWorking, type Triple } from "@/render/shade/colour-spaces";
import { encodeSrgb, reinhardFactor } from "@/render/shade/transfer";

const d65: Triple = [0.3127 / 0.329, 1, (1 - 0.3127 - 0.329) / 0.329];

describe("working spaces", () => {
  it.each(["rec709", "acescg"] as const)("show D65 as equal parts of %s", (space) => {
    for (const value of apply(xyzToWorking(space), d65)) expect(value).toBeCloseTo(1, 12);
  });

  it("show one light as the same colour, so that a file can be turned from one into the other", () => {
    const light = sumBlackBody(12_000);
    const direct = apply(xyzToWorking("acescg"), light);
    const turned = apply(rgbToRgb(primaries.rec709, primaries.acescg), apply(xyzToWorking("rec709"), light));
    turned.forEach((value, i) => expect(value / direct[i]!).toBeCloseTo(1, 12));
  });

  it("weigh luminance as the standards print it", () => {
    // ITU-R BT.709-6 table 3: 0.2126, 0.7152, 0.0722.
    const red = apply(xyzToWorking("rec709"), [0.4124, 0.2126, 0.0193]);
    [1, 0, 0].forEach((value, i) => expect(Math.abs(red[i]! - value)).toBeLessThan(5e-4));
  });
});

describe("transfer to the screen", () => {
  it("sRGB encoding has no step where its two parts meet", () => {
    expect(encodeSrgb(0.0031308)).toBeCloseTo(encodeSrgb(0.003130800001), 6);
  });

  // Reinhard et al. 2002, equation 4.
  it("the display curve maps white to 1, keeps black and never reverses brightness", () => {
    const shown = (luminance: number) => luminance * reinhardFactor(luminance, 8);
    expect(shown(8)).toBeCloseTo(1, 12);
    expect(shown(0)).toBe(0);
    for (let l = 0; l < 8; l += 0.1) expect(shown(l + 0.1)).toBeGreaterThan(shown(l));
  });
});
