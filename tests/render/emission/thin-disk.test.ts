import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  accretionForPeakTemperature,
  createThinDisk,
  diskFlux,
  eddingtonRate,
  peakTemperatureForAccretion,
  temperatureRatio,
} from "@/render/emission/thin-disk";
import { nodes, weights } from "@/render/spacetime/quadrature";
import { circularEnergy, iscoEnergy, iscoRadius, type Sense } from "@/render/spacetime/orbits";
import { between, seeded, spins } from "../paths/random-rays";

describe("the Page–Thorne disk", () => {
  it("has the roots and flux of PHYSICS §10 at a = 0.9, r = 4", () => {
    const disk = createThinDisk(0.9, "prograde");
    [1.248140468, 0.7292992757, -1.977439743].forEach((root, k) =>
      expect(disk.roots[k]).toBeCloseTo(root, 9),
    );
    expect(diskFlux(disk, 4)).toBeCloseTo(3.101377083284e-4, 15);
  });

  it("radiates what its matter loses, 1 − E_isco, turning with the hole or against it", () => {
    for (const [a, sense] of [
      [0.9, "retrograde"],
      [0.3, "retrograde"],
      [0.9999, "prograde"],
    ] as [number, Sense][]) {
      const disk = createThinDisk(a, sense);
      let sum = 0;
      for (let panel = 0; panel < 400; panel++)
        nodes.forEach((node, i) => {
          const q = (panel + node) / 400;
          const r = disk.isco / (q * q);
          const shell = 4 * Math.PI * r * diskFlux(disk, r) * circularEnergy(a, r, sense);
          sum += (weights[i]! / 400) * shell * ((2 * disk.isco) / q ** 3);
        });
      expect(sum / (1 - iscoEnergy(a, sense))).toBeCloseTo(1, 5);
    }
  });

  it("is dark at and inside its inner edge, brightest at one radius, and never negative", () => {
    fc.assert(
      fc.property(spins, between(1.0001, 200), (a, times) => {
        const disk = createThinDisk(a, "prograde");
        expect(diskFlux(disk, disk.isco)).toBe(0);
        expect(diskFlux(disk, 0.9 * disk.isco)).toBe(0);
        const ratio = temperatureRatio(disk, times * disk.isco);
        expect(ratio).toBeGreaterThanOrEqual(0);
        expect(ratio).toBeLessThanOrEqual(1 + 1e-12);
        expect(temperatureRatio(disk, disk.peakRadius)).toBeCloseTo(1, 12);
      }),
      seeded(300),
    );
  });

  it("changes smoothly through a = 0, where one root of its cubic vanishes", () => {
    const [still, slow] = [createThinDisk(0, "prograde"), createThinDisk(1e-9, "prograde")];
    expect(diskFlux(slow, 12) / diskFlux(still, 12)).toBeCloseTo(1, 7);
  });
});

describe("temperatures", () => {
  it("are 7.0e4 K (a = 0) and 9.0e4 K (a = 0.6) for 1e8 solar masses at a tenth of Eddington (FIELD §4)", () => {
    const peak = (a: number) =>
      peakTemperatureForAccretion(1e8, a, "prograde", 0.1 * eddingtonRate(1e8, a, "prograde"));
    expect(peak(0) / 1e4).toBeCloseTo(7.0, 1);
    expect(peak(0.6) / 1e4).toBeCloseTo(9.0, 1);
  });

  it("and accretion rates undo each other", () => {
    const rate = accretionForPeakTemperature(4e7, 0.6, "retrograde", 9000);
    expect(peakTemperatureForAccretion(4e7, 0.6, "retrograde", rate)).toBeCloseTo(9000, 8);
  });

  it("fall as M^−¼ at the same Eddington fraction (Shakura & Sunyaev 1973)", () => {
    const peak = (mass: number) =>
      peakTemperatureForAccretion(mass, 0.5, "prograde", eddingtonRate(mass, 0.5, "prograde"));
    expect(peak(1e4) / peak(1e8)).toBeCloseTo(10, 9);
  });
});

it("the disk begins where the last stable orbit is", () => {
  expect(createThinDisk(0.5, "retrograde").isco).toBe(iscoRadius(0.5, "retrograde"));
});
