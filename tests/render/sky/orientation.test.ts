import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { skyRotation, worldDirection } from "@/render/sky/orientation";

const radians = Math.PI / 180;
const angle = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe("the sky's orientation", () => {
  it("by default has φ = RA and θ = 90° − Dec, whatever RA the pole is given", () => {
    fc.assert(
      fc.property(angle(0, 360), angle(-90, 90), angle(0, 360), (ra, dec, poleRaDeg) => {
        const rotation = skyRotation({ poleRaDeg, poleDecDeg: 90, turnDeg: 0 });
        const expected = [
          Math.cos(dec * radians) * Math.cos(ra * radians),
          Math.cos(dec * radians) * Math.sin(ra * radians),
          Math.sin(dec * radians),
        ];
        worldDirection(rotation, ra, dec).forEach((value, i) => expect(value).toBeCloseTo(expected[i]!, 12));
      }),
      { seed: 90 },
    );
  });

  it("points the spin axis to the pole, for any pole and turn", () => {
    fc.assert(
      fc.property(angle(0, 360), angle(-90, 90), angle(-180, 180), (poleRaDeg, poleDecDeg, turnDeg) => {
        const rotation = skyRotation({ poleRaDeg, poleDecDeg, turnDeg });
        expect(worldDirection(rotation, poleRaDeg, poleDecDeg)[2]).toBeCloseTo(1, 12);
      }),
      { seed: 91 },
    );
  });

  it("keeps angles between stars and never mirrors them", () => {
    fc.assert(
      fc.property(angle(0, 360), angle(-90, 90), angle(-180, 180), (poleRaDeg, poleDecDeg, turnDeg) => {
        const r = skyRotation({ poleRaDeg, poleDecDeg, turnDeg });
        for (let i = 0; i < 3; i++)
          for (let j = 0; j < 3; j++) {
            const dot = r[3 * i]! * r[3 * j]! + r[3 * i + 1]! * r[3 * j + 1]! + r[3 * i + 2]! * r[3 * j + 2]!;
            expect(dot).toBeCloseTo(i === j ? 1 : 0, 12);
          }
        const determinant =
          r[0]! * (r[4]! * r[8]! - r[5]! * r[7]!) -
          r[1]! * (r[3]! * r[8]! - r[5]! * r[6]!) +
          r[2]! * (r[3]! * r[7]! - r[4]! * r[6]!);
        expect(determinant).toBeCloseTo(1, 12);
      }),
      { seed: 92 },
    );
  });

  it("the turn moves every star toward greater φ", () => {
    const rotation = skyRotation({ poleRaDeg: 0, poleDecDeg: 90, turnDeg: 20 });
    const [x, y] = worldDirection(rotation, 30, 0);
    expect(Math.atan2(y, x) / radians).toBeCloseTo(50, 12);
  });
});
