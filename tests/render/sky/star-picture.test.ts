// Stars through a camera: where they stand, and how much light their images carry.
import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { buildSky } from "@/lib/local/build-sky";
import { pixelSolidAngle } from "@/render/scene/lenses";
import { sumBlackBody } from "@/render/shade/black-body-colour";
import { planFrame } from "@/render/shade/frame-plan";
import type { Quality } from "@/render/shade/quality";
import { renderTile } from "@/render/shade/render-tile";
import { colourTemperature, decodeCatalogue, type Star } from "@/render/sky/catalogue";
import { magnitudeZeroSolidAngle } from "@/render/sky/star-field";
import { smallSetup, type Changes } from "../shade/small-setup";

const radians = Math.PI / 180;
const folder = mkdtempSync(path.join(tmpdir(), "stars-"));
let catalogue: Star[] = [];
beforeAll(async () => {
  await buildSky(folder);
  catalogue = decodeCatalogue(readFileSync(path.join(folder, "stars.bin")));
});
afterAll(() => rmSync(folder, { recursive: true }));

function photograph(changes: Changes, stars: readonly Star[], quality: Quality = "proof") {
  const setup = smallSetup({ disk: null, ...changes, sky: { kind: "stars", ...changes.sky } });
  const { width, height } = setup.picture;
  const { rgba } = renderTile(planFrame(setup, setup.time.first, quality, "rec709", stars), 0, height);
  const luminance = Float64Array.from(
    { length: width * height },
    (_, i) => 0.2126 * rgba[4 * i]! + 0.7152 * rgba[4 * i + 1]! + 0.0722 * rgba[4 * i + 2]!,
  );
  return { setup, width, height, rgba, luminance };
}

describe("a distant camera without a bending hole in its view", () => {
  const fieldDeg = 30;
  // At φ = 0 and yaw 97° the camera looks to φ = 180° − 97° = 83°: right ascension 83°, on the equator.
  const aim = { raDeg: 83, decDeg: 0 };
  const changes: Changes = {
    hole: { spin: 0 },
    camera: {
      radius: 1e6,
      inclinationDeg: 90,
      yawDeg: 97,
      lens: { kind: "rectilinear", horizontalFieldDeg: fieldDeg },
    },
    picture: { width: 300, height: 300 },
  };

  /** Pixel of a star by the gnomonic projection, RA growing to the left, north up (PHYSICS §14). */
  function pixelOf({ raDeg, decDeg }: { raDeg: number; decDeg: number }) {
    const [ra, dec] = [(raDeg - aim.raDeg) * radians, decDeg * radians];
    const scale = 300 / (2 * Math.tan((fieldDeg / 2) * radians));
    return [149.5 - scale * Math.tan(ra), 149.5 - (scale * Math.tan(dec)) / Math.cos(ra)] as const;
  }

  /** Light-weighted centre of the five-pixel square round a pixel. */
  function centroid(
    { luminance, width }: ReturnType<typeof photograph>,
    [px, py]: readonly [number, number],
  ) {
    let [sum, sumX, sumY] = [0, 0, 0];
    for (let y = Math.round(py) - 2; y <= Math.round(py) + 2; y++)
      for (let x = Math.round(px) - 2; x <= Math.round(px) + 2; x++) {
        const light = luminance[y * width + x]!;
        sum += light;
        sumX += light * x;
        sumY += light * y;
      }
    return [sumX / sum, sumY / sum];
  }

  /** The brightest pixel, and the brightest that is not part of the same star. */
  function brightestTwo(luminance: Float64Array, width: number) {
    const order = [...luminance.keys()].sort((a, b) => luminance[b]! - luminance[a]!);
    const apart = (a: number, b: number) =>
      Math.hypot((a % width) - (b % width), Math.floor(a / width) - Math.floor(b / width));
    return [order[0]!, order.find((i) => apart(i, order[0]!) > 5)!] as const;
  }

  // Betelgeuse and Rigel (HIP 27989, 24436): positions from memory, Hipparcos catalogue (ESA 1997).
  const named = {
    Betelgeuse: { raDeg: 88.793, decDeg: 7.407 },
    Rigel: { raDeg: 78.634, decDeg: -8.202 },
  };

  it("shows Betelgeuse up at the left and Rigel down at the right of Orion, each within half a pixel of its place", () => {
    const picture = photograph(changes, catalogue);
    for (const star of Object.values(named)) {
      const [x, y] = pixelOf(star);
      const [seenX, seenY] = centroid(picture, [x, y]);
      expect(Math.abs(seenX! - x)).toBeLessThan(0.5);
      expect(Math.abs(seenY! - y)).toBeLessThan(0.5);
    }
    const [left, up] = pixelOf(named.Betelgeuse);
    const [right, down] = pixelOf(named.Rigel);
    expect(left).toBeLessThan(149.5);
    expect(right).toBeGreaterThan(149.5);
    expect(up).toBeLessThan(down);
  });

  it("shows them as the two brightest stars there, Betelgeuse redder", () => {
    const { rgba, luminance, width } = photograph(changes, catalogue);
    const places = Object.values(named).map(pixelOf);
    const [i, j] = brightestTwo(luminance, width);
    for (const [x, y] of places)
      expect([i, j].some((k) => Math.hypot((k % width) - x, Math.floor(k / width) - y) < 1.5)).toBe(true);
    const redness = ([x, y]: readonly [number, number]) => {
      const k = 4 * (Math.round(y) * width + Math.round(x));
      return rgba[k]! / rgba[k + 2]!;
    };
    expect(redness(places[0]!)).toBeGreaterThan(3 * redness(places[1]!));
  });

  it("gives a star the light of its magnitude, within two per cent", () => {
    const star = { raDeg: 85.3, decDeg: 3.1, magnitude: 1.5, colourIndex: 0.4 };
    const { setup, luminance, width } = photograph(changes, [star]);
    const { camera, picture } = setup;
    let light = 0;
    luminance.forEach((value, i) => {
      light += value * pixelSolidAngle(camera.lens, picture, i % width, Math.floor(i / width));
    });
    expect(Math.abs(light / (magnitudeZeroSolidAngle * 10 ** (-0.4 * 1.5)) - 1)).toBeLessThan(0.02);
  });
});

describe("a star behind the hole", () => {
  // PHYSICS §11: a held camera at r = 50, a = 0; seen at 0.405518734 rad from the hole, a star stands at azimuth
  // 2.961896402878 and is magnified 1.32218557402 times.
  // At master quality: bending narrows the image so much that one path a pixel is too few for three per cent.
  it("is magnified, and shifted by the camera's height, as the closed form says, within three per cent", () => {
    const star = { raDeg: 2.961896402878 / radians, decDeg: 0, magnitude: 0, colourIndex: 0.65 };
    const lens = { kind: "rectilinear", horizontalFieldDeg: 5 } as const;
    const changes: Changes = {
      hole: { spin: 0 },
      camera: { radius: 50, inclinationDeg: 90, yawDeg: 0.405518734 / radians, lens },
      picture: { width: 200, height: 200 },
    };
    const { setup, luminance, width } = photograph(changes, [star], "master");
    let [light, sumX] = [0, 0];
    luminance.forEach((value, i) => {
      const here = value * pixelSolidAngle(lens, setup.picture, i % width, Math.floor(i / width));
      light += here;
      sumX += here * (i % width);
    });
    const T = colourTemperature(star.colourIndex);
    const shift = sumBlackBody(T / Math.sqrt(1 - 2 / 50))[1] / sumBlackBody(T)[1];
    expect(Math.abs(light / (magnitudeZeroSolidAngle * 1.32218557402 * shift) - 1)).toBeLessThan(0.03);
    expect(Math.abs(sumX / light - 99.5)).toBeLessThan(0.2);
  });
});
