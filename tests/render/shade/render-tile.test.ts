import { describe, expect, it } from "vitest";
import type { Setup } from "@/render/scene/setup";
import { planFrame } from "@/render/shade/frame-plan";
import type { Quality } from "@/render/shade/quality";
import { renderTile } from "@/render/shade/render-tile";
import { encodeCatalogue, decodeCatalogue, type Star } from "@/render/sky/catalogue";
import { smallSetup } from "./small-setup";

const catalogue: Star[] = decodeCatalogue(
  encodeCatalogue(
    Array.from({ length: 500 }, (_, i) => ({
      raDeg: (i * 137.508) % 360,
      decDeg: (Math.asin(1 - (2 * i + 1) / 500) * 180) / Math.PI,
      magnitude: (i % 7) - 1,
      colourIndex: (i % 19) / 10 - 0.3,
    })),
  ),
);

const plan = (setup: Setup, quality: Quality = "proof") =>
  planFrame(setup, setup.time.first, quality, "rec709", catalogue);

function whole(setup: Setup, quality?: Quality) {
  const { width, height } = setup.picture;
  const { rgba } = renderTile(plan(setup, quality), 0, height);
  const pixel = (x: number, y: number) => [...rgba.subarray(4 * (y * width + x), 4 * (y * width + x) + 4)];
  return { rgba, pixel, width, height };
}

describe("a tile", () => {
  const setup = smallSetup({ sky: { kind: "stars", starStops: 6 } });

  it.each(["proof", "master"] as const)(
    "has the same bytes whatever the tiling and the order, at %s quality",
    (quality) => {
      const { rgba, width, height } = whole(setup, quality);
      const assembled = new Float32Array(rgba.length);
      const bounds = [0, 1, 2, 9, 30, 31, 47, height];
      const tiles = bounds.slice(0, -1).map((y0, i) => [y0, bounds[i + 1]!] as const);
      const shared = plan(setup, quality);
      for (const [y0, y1] of [...tiles].sort((a, b) => ((a[0] * 7) % 11) - ((b[0] * 7) % 11))) {
        // Every other tile from a plan of its own, as another thread would have it.
        const { rgba: rows } = renderTile(y0 % 2 ? plan(setup, quality) : shared, y0, y1);
        assembled.set(rows, 4 * y0 * width);
      }
      expect(Buffer.compare(Buffer.from(assembled.buffer), Buffer.from(rgba.buffer))).toBe(0);
    },
  );

  it("holds only finite numbers, and no path that ends nowhere", () => {
    const { rgba } = whole(setup);
    expect(rgba.every(Number.isFinite)).toBe(true);
    expect(renderTile(plan(setup), 0, 54)).toMatchObject({ unresolved: [], paths: 96 * 54 });
  });

  it("has alpha 1 on the hole and the disk, 0 on the sky, and between where a pixel has both", () => {
    const { pixel } = whole(smallSetup({ camera: { inclinationDeg: 10, radius: 200 } }), "master");
    expect(pixel(48, 27)).toEqual([0, 0, 0, 1]);
    expect(pixel(0, 0)).toEqual([0, 0, 0, 0]);
    const { rgba } = whole(smallSetup({ camera: { inclinationDeg: 10, radius: 200 } }), "master");
    const alphas = new Set(rgba.filter((_, i) => i % 4 === 3));
    expect([...alphas].every((alpha) => [0, 0.25, 0.5, 0.75, 1].includes(alpha))).toBe(true);
    expect(alphas.size).toBeGreaterThan(3);
  });

  it("doubles its light with each stop of exposure", () => {
    const dark = whole(smallSetup());
    const bright = whole(smallSetup({ picture: { exposureStops: 3 } }));
    dark.rgba.forEach((value, i) => expect(bright.rgba[i]).toBeCloseTo(i % 4 === 3 ? value : 8 * value, 4));
  });

  it("shows nothing outside a dome's circle, and traces nothing there", () => {
    const lens = { kind: "dome", fieldDeg: 180, tiltDeg: 0 } as const;
    const dome = smallSetup({ camera: { lens }, picture: { width: 64, height: 64 } });
    const { pixel } = whole(dome);
    for (const [x, y] of [
      [0, 0],
      [63, 0],
      [0, 63],
      [63, 63],
    ] as const)
      expect(pixel(x, y)).toEqual([0, 0, 0, 0]);
    // FIELD §2: the circle covers 78.54 % of the square.
    expect(renderTile(plan(dome), 0, 64).paths / 64 ** 2).toBeCloseTo(0.7854, 2);
  });

  it("needs a catalogue only for a sky of stars", () => {
    expect(() => planFrame(setup, 1001, "proof", "rec709", null)).toThrow("no catalogue was given");
    expect(() => planFrame(smallSetup(), 1001, "proof", "rec709", null)).not.toThrow();
  });
});
