import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { carlsonRf, carlsonRj, completeK, completePi, completeSnSquared } from "@/render/spacetime/carlson";
import { between, seeded } from "../paths/random-rays";

/** Midpoint sums over a period converge faster than any power, so this is an independent value of each integral. */
const overQuarter = (f: (sin2: number) => number) => {
  const count = 4000;
  let sum = 0;
  for (let k = 0; k < count; k++) sum += f(Math.sin(((k + 0.5) * Math.PI) / (2 * count)) ** 2);
  return (sum * Math.PI) / (2 * count);
};

describe("elliptic integrals", () => {
  it("have Carlson's own check values (1995, table; from memory)", () => {
    expect(carlsonRf(1, 2, 0)).toBeCloseTo(1.3110287771461, 12);
    expect(carlsonRf(2, 3, 4)).toBeCloseTo(0.58408284167715, 13);
    expect(carlsonRj(0, 1, 2, 3)).toBeCloseTo(0.77688623778582, 13);
    expect(carlsonRj(2, 3, 4, 5)).toBeCloseTo(0.14297579667157, 13);
  });

  it("equal their defining integrals, for negative parameters too", () => {
    fc.assert(
      fc.property(between(-40, 0.9), between(-20, 0.9), (m, n) => {
        expect(completeK(m)).toBeCloseTo(
          overQuarter((s) => 1 / Math.sqrt(1 - m * s)),
          11,
        );
        expect(completePi(n, m)).toBeCloseTo(
          overQuarter((s) => 1 / ((1 - n * s) * Math.sqrt(1 - m * s))),
          11,
        );
        expect(completeSnSquared(m)).toBeCloseTo(
          overQuarter((s) => s / Math.sqrt(1 - m * s)),
          11,
        );
      }),
      seeded(200),
    );
  });
});
