import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { buildSky } from "@/lib/local/build-sky";
import { colourTemperature, decodeCatalogue, encodeCatalogue, type Star } from "@/render/sky/catalogue";

const folder = mkdtempSync(path.join(tmpdir(), "sky-"));
let stars: Star[] = [];
beforeAll(async () => {
  await buildSky(folder);
  stars = decodeCatalogue(readFileSync(path.join(folder, "stars.bin")));
});
afterAll(() => rmSync(folder, { recursive: true }));

describe("the star catalogue", () => {
  it("holds the 41,411 stars of the source, down to magnitude 8", () => {
    expect(stars).toHaveLength(41_411);
    expect(Math.max(...stars.map((star) => star.magnitude))).toBe(8);
  });

  // Positions and magnitudes of Sirius and Polaris: Hipparcos catalogue (ESA 1997), HIP 32349 and 11767; from memory.
  it("has Sirius and Polaris where and as bright as the Hipparcos catalogue has them", () => {
    const brightest = stars.reduce((a, b) => (a.magnitude < b.magnitude ? a : b));
    expect(brightest.raDeg).toBeCloseTo(101.287, 2);
    expect(brightest.decDeg).toBeCloseTo(-16.716, 2);
    expect(brightest.magnitude).toBe(-1.44);
    const polaris = stars.find((star) => star.decDeg > 89.2 && star.magnitude < 2.1)!;
    expect(polaris.raDeg).toBeCloseTo(37.95, 1);
    expect(polaris.colourIndex).toBeCloseTo(0.636, 3);
  });

  it("comes with the licence of its source", () => {
    const licence = readFileSync(path.join(folder, "LICENSE"), "utf8");
    expect(licence).toContain("Copyright (c) 2015, Olaf Frohn");
    expect(licence).toContain("VizieR V/137D");
  });

  it("refuses bytes that are no catalogue, or are cut short", () => {
    const bytes = encodeCatalogue(stars.slice(0, 3));
    expect(() => decodeCatalogue(bytes.subarray(0, 40))).toThrow("cut short");
    expect(() => decodeCatalogue(new Uint8Array(64))).toThrow("no star catalogue");
    expect(() => decodeCatalogue(Uint8Array.of(...bytes.subarray(0, 4), 9, ...bytes.subarray(5)))).toThrow(
      "version 9",
    );
  });
});

describe("colour temperature", () => {
  // Ballesteros 2012 compares his formula with the Sun: B−V = 0.65, 5778 K (within 1.5 %; from memory).
  it("gives a sunlike star about the Sun's temperature, bluer stars more, redder less", () => {
    expect(Math.abs(colourTemperature(0.65) / 5778 - 1)).toBeLessThan(0.015);
    let last = Infinity;
    for (let index = -0.4; index < 5.5; index += 0.1) {
      expect(colourTemperature(index)).toBeLessThan(last);
      last = colourTemperature(index);
    }
    expect(last).toBeGreaterThan(1000);
  });
});
