import { describe, expect, it } from "vitest";
import {
  accelerationInSi,
  gravitationalRadius,
  gravitationalTime,
  lengthInKm,
  solarMassesToKg,
  stefanBoltzmann,
  timeInM,
  timeInSeconds,
} from "@/render/units";

describe("units", () => {
  it("has the Stefan–Boltzmann constant 5.670374419e-8 (CODATA 2018, from memory)", () => {
    expect(stefanBoltzmann).toBeCloseTo(5.670374419e-8, 16);
  });

  it("weighs the Sun at 1.98841e30 kg: the nominal GM over CODATA's G (IAU 2015 B3)", () => {
    expect(solarMassesToKg(1) / 1.98841e30).toBeCloseTo(1, 5);
  });

  it("has 1.47663 km and 4.925491 µs to a solar mass (FIELD, first line)", () => {
    expect(lengthInKm(1, 1)).toBeCloseTo(1.47663, 5);
    expect(gravitationalTime(1) * 1e6).toBeCloseTo(4.925491, 6);
  });

  it("scales every length and time with the mass", () => {
    expect(gravitationalRadius(4e7)).toBeCloseTo(4e7 * gravitationalRadius(1), 0);
    expect(timeInM(4e7, timeInSeconds(4e7, 123.25))).toBeCloseTo(123.25, 12);
  });

  it("pulls at 1/r² in ordinary units: the Sun's 274 m/s² at its surface", () => {
    const radius = 6.957e8 / gravitationalRadius(1);
    expect(accelerationInSi(1, 1 / radius ** 2)).toBeCloseTo(274.2, 1);
  });
});
