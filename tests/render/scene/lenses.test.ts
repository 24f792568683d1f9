import { describe, expect, it } from "vitest";
import { lensDirection, pixelAngle, pixelSolidAngle, type Raster } from "@/render/scene/lenses";
import type { Lens } from "@/render/scene/setup";

function total(lens: Lens, raster: Raster) {
  let sum = 0;
  for (let y = 0; y < raster.height; y++)
    for (let x = 0; x < raster.width; x++) sum += pixelSolidAngle(lens, raster, x, y);
  return sum;
}

const cases: [string, Lens, Raster, number, number][] = [
  [
    "a panorama covers the whole sphere",
    { kind: "panorama" },
    { width: 200, height: 100 },
    4 * Math.PI,
    1e-12,
  ],
  [
    "a dome of 180° covers half of it",
    { kind: "dome", fieldDeg: 180, tiltDeg: 0 },
    { width: 512, height: 512 },
    2 * Math.PI,
    1e-3,
  ],
  [
    "a square pinhole of 90° covers a sixth of it",
    { kind: "rectilinear", horizontalFieldDeg: 90 },
    { width: 400, height: 400 },
    (4 * Math.PI) / 6,
    1e-5,
  ],
];

describe("pixels' solid angles", () => {
  it.each(cases)("%s", (_, lens, raster, expected, tolerance) => {
    expect(Math.abs(total(lens, raster) / expected - 1)).toBeLessThan(tolerance);
  });

  it("agree with the area between neighbouring directions, for every lens", () => {
    for (const [, lens, raster] of cases) {
      const [px, py] = [raster.width * 0.7, raster.height * 0.6];
      const at = (dx: number, dy: number) => {
        const out = new Float64Array(3);
        lensDirection(lens, raster, px + dx, py + dy, out);
        return out;
      };
      const h = 1e-3;
      const across = at(h, 0).map((value, i) => (value - at(-h, 0)[i]!) / (2 * h));
      const down = at(0, h).map((value, i) => (value - at(0, -h)[i]!) / (2 * h));
      const [a0, a1, a2] = [across[0]!, across[1]!, across[2]!];
      const [d0, d1, d2] = [down[0]!, down[1]!, down[2]!];
      const area = Math.hypot(a1 * d2 - a2 * d1, a2 * d0 - a0 * d2, a0 * d1 - a1 * d0);
      expect(pixelSolidAngle(lens, raster, px, py) / area).toBeCloseTo(1, 4);
    }
  });
});

describe("the middle pixel's angle", () => {
  it("is that between neighbouring pixels there", () => {
    for (const [, lens, raster] of cases) {
      const [a, b] = [new Float64Array(3), new Float64Array(3)];
      const middle = raster.height / 2 - 0.5;
      lensDirection(lens, raster, raster.width / 2 - 0.51, middle, a);
      lensDirection(lens, raster, raster.width / 2 - 0.49, middle, b);
      const angle = Math.hypot(a[0]! - b[0]!, a[1]! - b[1]!, a[2]! - b[2]!) / 0.02;
      expect(angle / pixelAngle(lens, raster)).toBeCloseTo(1, 4);
    }
  });
});
