import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { lookUpBlackBody, sumBlackBody } from "@/render/shade/black-body-colour";
import { cieX, cieY, cieZ } from "@/render/shade/cie-1931";

const lookUp = (temperature: number) => {
  const out = new Float64Array(3);
  lookUpBlackBody(temperature, out);
  return [...out];
};

describe("the CIE 1931 table", () => {
  // Sums of the 1 nm table 360–830 nm; from memory, and reproduced by the chromaticities of section 9 to 1e-10.
  it("has 471 rows with the sums of the published table", () => {
    const sum = (column: readonly number[]) => column.reduce((a, b) => a + b, 0);
    expect([cieX.length, cieY.length, cieZ.length]).toEqual([471, 471, 471]);
    expect(sum(cieX)).toBeCloseTo(106.865469, 5);
    expect(sum(cieY)).toBeCloseTo(106.856917, 5);
    expect(sum(cieZ)).toBeCloseTo(106.892251, 5);
  });
});

describe("the black-body look-up", () => {
  it("agrees with the direct sum to one part in a million from 250 K to 1e8 K", () => {
    fc.assert(
      fc.property(fc.double({ min: Math.log(250), max: Math.log(1e8), noNaN: true }), (logT) => {
        const T = Math.exp(logT);
        const direct = sumBlackBody(T);
        lookUp(T).forEach((value, i) => expect(Math.abs(value / direct[i]! - 1)).toBeLessThan(1e-6));
      }),
      { seed: 1931, numRuns: 300 },
    );
  });

  it("grows in proportion to temperature where its table ends, as the direct sum does", () => {
    const direct = sumBlackBody(3e9);
    lookUp(3e9).forEach((value, i) => expect(value / direct[i]!).toBeCloseTo(1, 3));
  });

  it("is black for cold bodies and for temperatures that are no numbers", () => {
    for (const T of [0, 10, 199, NaN]) expect(lookUp(T)).toEqual([0, 0, 0]);
  });
});
