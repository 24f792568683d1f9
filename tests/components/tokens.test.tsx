// The colours of app/tokens.css against WCAG 2.2 (relative luminance and contrast ratio as defined there; levels of SC
// 1.4.3 and 1.4.11), against the ratios the look was drawn with, and against Planck's law through our own colour code.
import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { sumBlackBody } from "@/render/shade/black-body-colour";
import { apply, primaries, rgbToXyz, type Triple } from "@/render/shade/colour-spaces";

type Room = "desk" | "viewing";
const sheet = readFileSync("app/tokens.css", "utf8");

function readTokens(room: Room): Record<string, string> {
  const block = new RegExp(`\\[data-room="${room}"\\] \\{([^}]*)\\}`, "g");
  const body = [...sheet.matchAll(block)].map((match) => match[1]).join("\n");
  return Object.fromEntries(
    [...body.matchAll(/--([a-z]+): (#[0-9a-f]{6});/g)].map((match) => [match[1], match[2]!]),
  );
}

const tokens = { desk: readTokens("desk"), viewing: readTokens("viewing") };
const channels = (hex: string) =>
  [1, 3, 5].map((start) => parseInt(hex.slice(start, start + 2), 16)) as unknown as Triple;

const linear = (hex: string) =>
  channels(hex).map((value) => {
    const share = value / 255;
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
  }) as unknown as Triple;

function luminance(hex: string): number {
  const [r, g, b] = linear(hex);
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

function contrast(a: string, b: string): number {
  const [light, dark] = [luminance(a), luminance(b)].sort((x, y) => y - x) as [number, number];
  return (light + 0.05) / (dark + 0.05);
}

const drawn = {
  viewing: { edge: 4.58, text: 11.97, soft: 7.17, bright: 16.45, ember: 5.92, daylight: 11.69, ice: 10.33 },
  desk: { edge: 4.14, text: 14.96, soft: 6.51, bright: 18.23, ember: 5.35, daylight: 6.12, ice: 6.54 },
};

describe.each(["desk", "viewing"] as const)("the %s", (room) => {
  const of = (name: string) => tokens[room][name]!;

  it.each(["text", "soft", "bright", "ember", "daylight", "ice"])(
    "lets %s be read on every ground",
    (name) => {
      for (const ground of ["ground", "raised", "sunk"])
        expect(contrast(of(name), of(ground))).toBeGreaterThanOrEqual(4.5);
    },
  );

  it("shows the edge of a control on every ground", () => {
    for (const ground of ["ground", "raised", "sunk"])
      expect(contrast(of("edge"), of(ground))).toBeGreaterThanOrEqual(3);
  });

  it("lets the ground be read on a filled button", () => {
    expect(contrast(of("fill"), of("ground"))).toBeGreaterThanOrEqual(4.5);
    expect(contrast(of("bright"), of("ground"))).toBeGreaterThanOrEqual(4.5);
  });

  it.each(Object.entries(drawn[room]))("has %s at the contrast it was drawn with, %f", (name, ratio) => {
    expect(contrast(of(name), of("ground"))).toBeCloseTo(ratio, 2);
  });
});

it("keeps the viewing room's greys without tint", () => {
  for (const name of ["ground", "raised", "sunk", "hair", "rule", "edge", "text", "soft", "bright", "fill"])
    expect(new Set(channels(tokens.viewing[name]!)).size).toBe(1);
});

/** CIE 1976 u′, v′ (CIE 15:2018, 8.2.1). */
const chromaticity = ([x, y, z]: Triple) =>
  [(4 * x) / (x + 15 * y + 3 * z), (9 * y) / (x + 15 * y + 3 * z)] as const;

const lamps = [
  ["viewing", "ember", 1900, 0.295],
  ["viewing", "daylight", 6500, 0.63],
  ["viewing", "ice", 12000, 0.55],
  ["desk", "ember", 1900, 0.12],
  ["desk", "daylight", 6500, 0.098],
  ["desk", "ice", 12000, 0.09],
] as const;

// Eight bits a channel move u′, v′ by about 0.001 here, and 1,900 K lies just outside Rec.709, so the embers were drawn a
// little toward white: they come within 0.005 of Planck's colour, the others within 0.001.
it.each(lamps)(
  "gives the %s %s the chromaticity of a body at %d K and the luminance %f",
  (room, name, temperatureK, y) => {
    const xyz = apply(rgbToXyz(primaries.rec709), linear(tokens[room][name]!));
    const [u, v] = chromaticity(xyz);
    const [planckU, planckV] = chromaticity(sumBlackBody(temperatureK));
    expect(Math.hypot(u - planckU, v - planckV)).toBeLessThan(name === "ember" ? 0.005 : 0.001);
    expect(Math.abs(xyz[1] / y - 1)).toBeLessThan(0.012);
  },
);
