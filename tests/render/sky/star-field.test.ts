import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { sumBlackBody } from "@/render/shade/black-body-colour";
import { colourTemperature, type Star } from "@/render/sky/catalogue";
import { skyRotation, worldDirection } from "@/render/sky/orientation";
import { addStarLight, magnitudeZeroSolidAngle, prepareStarField } from "@/render/sky/star-field";

const upright = { poleRaDeg: 0, poleDecDeg: 90, turnDeg: 0 };

function lightAt(field: ReturnType<typeof prepareStarField>, [x, y, z]: readonly number[], g = 1) {
  const out = new Float64Array(3);
  addStarLight(field, x!, y!, z!, g, out);
  return out;
}

/** Light of the whole sphere: the sum over a fine lattice of directions, each times its solid angle. */
function totalLuminance(
  field: ReturnType<typeof prepareStarField>,
  step: number,
  around: Star,
  reach: number,
) {
  let sum = 0;
  for (let dec = around.decDeg - reach; dec <= around.decDeg + reach; dec += step)
    for (let ra = around.raDeg - reach * 4; ra <= around.raDeg + reach * 4; ra += step) {
      const solidAngle = Math.cos((dec * Math.PI) / 180) * ((step * Math.PI) / 180) ** 2;
      sum += lightAt(field, worldDirection(skyRotation(upright), ra, dec))[1]! * solidAngle;
    }
  return sum;
}

describe("the star field", () => {
  it("gives a star of magnitude m the light of 10^(−0.4 m) units, wherever it stands", () => {
    const sigma = (0.3 * Math.PI) / 180;
    for (const star of [
      { raDeg: 180, decDeg: 0, magnitude: 0, colourIndex: 0.65 },
      { raDeg: 359.9, decDeg: 62, magnitude: 2.5, colourIndex: 1.4 },
      { raDeg: 20, decDeg: -70, magnitude: 5, colourIndex: -0.1 },
    ]) {
      const light = totalLuminance(prepareStarField([star], upright, sigma, 0), 0.1, star, 1.3);
      const expected = magnitudeZeroSolidAngle * 10 ** (-0.4 * star.magnitude);
      expect(Math.abs(light / expected - 1)).toBeLessThan(0.005);
    }
  });

  it("brightens by a factor of two per stop", () => {
    const star = { raDeg: 10, decDeg: 20, magnitude: 3, colourIndex: 0.5 };
    const at = worldDirection(skyRotation(upright), star.raDeg, star.decDeg);
    const [plain, brighter] = [0, 3].map(
      (stops) => lightAt(prepareStarField([star], upright, 0.01, stops), at)[1]!,
    );
    expect(brighter! / plain!).toBeCloseTo(8, 10);
  });

  it("shows a shifted star as a black body of g times its temperature", () => {
    const star = { raDeg: 10, decDeg: 20, magnitude: 3, colourIndex: 0.5 };
    const T = colourTemperature(star.colourIndex);
    const at = worldDirection(skyRotation(upright), star.raDeg, star.decDeg);
    const field = prepareStarField([star], upright, 0.01, 0);
    const [plain, shifted] = [lightAt(field, at), lightAt(field, at, 1.7)];
    const [emitted, seen] = [sumBlackBody(T), sumBlackBody(1.7 * T)];
    for (let k = 0; k < 3; k++) expect(shifted[k]! / plain[k]! / (seen[k]! / emitted[k]!)).toBeCloseTo(1, 5);
  });

  it("finds through its index exactly what a search of all stars finds, near poles and seams too", () => {
    const anywhere = fc.record({
      raDeg: fc.double({ min: 0, max: 360, noNaN: true }),
      decDeg: fc.double({ min: -90, max: 90, noNaN: true }),
      magnitude: fc.constant(1),
      colourIndex: fc.constant(0.3),
    });
    const sigma = fc.double({ min: 0.001, max: 0.2, noNaN: true });
    fc.assert(
      fc.property(
        fc.array(anywhere, { minLength: 1, maxLength: 20 }),
        sigma,
        anywhere,
        (stars, width, probe) => {
          const direction = worldDirection(skyRotation(upright), probe.raDeg, probe.decDeg);
          const together = lightAt(prepareStarField(stars, upright, width, 0), direction)[1]!;
          const singly = stars.map((star) => {
            const [x, y, z] = worldDirection(skyRotation(upright), star.raDeg, star.decDeg);
            const apart = (direction[0] - x) ** 2 + (direction[1] - y) ** 2 + (direction[2] - z) ** 2;
            const peak = (magnitudeZeroSolidAngle * 10 ** -0.4) / (2 * Math.PI * width * width);
            return apart > 16 * width * width ? 0 : peak * Math.exp(-apart / (2 * width * width));
          });
          const sum = singly.reduce((a, b) => a + b, 0);
          expect(Math.abs(together - sum)).toBeLessThanOrEqual(1e-5 * sum);
        },
      ),
      { seed: 137, numRuns: 300 },
    );
  });
});
