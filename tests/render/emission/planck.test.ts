import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  blackBodyRadiance,
  planckByFrequency,
  planckByWavelength,
  secondRadiationConstant,
} from "@/render/emission/planck";
import { speedOfLight, stefanBoltzmann } from "@/render/units";

describe("black-body radiation", () => {
  it("has the constants that CODATA 2018 prints", () => {
    expect(Math.abs(secondRadiationConstant - 1.438776877e-2)).toBeLessThan(1e-11);
    expect(stefanBoltzmann / 5.670374419e-8).toBeCloseTo(1, 9);
  });

  it("sums over all wavelengths to σT⁴/π", () => {
    for (const T of [1000, 5772, 1e5]) {
      const step = 1e-3;
      let sum = 0;
      for (let x = -4; x < 6; x += step) {
        const wavelength = (secondRadiationConstant / T) * Math.exp(x);
        sum += planckByWavelength(wavelength, T) * wavelength * step;
      }
      expect(sum / blackBodyRadiance(T)).toBeCloseTo(1, 5);
    }
  });

  it("is the same by frequency and by wavelength, and keeps I/ν³ when shifted", () => {
    const positive = (min: number, max: number) => fc.double({ min, max, noNaN: true });
    fc.assert(
      fc.property(positive(3e-7, 1e-5), positive(2000, 1e6), positive(0.2, 4), (wavelength, T, g) => {
        const nu = speedOfLight / wavelength;
        const byFrequency = (planckByFrequency(nu, T) * speedOfLight) / wavelength ** 2;
        expect(planckByWavelength(wavelength, T) / byFrequency).toBeCloseTo(1, 11);
        expect((g ** 3 * planckByFrequency(nu / g, T)) / planckByFrequency(nu, g * T)).toBeCloseTo(1, 10);
      }),
      { seed: 1901 },
    );
  });
});
