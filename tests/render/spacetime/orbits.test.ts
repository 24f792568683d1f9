import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { metric } from "@/render/spacetime/kerr";
import {
  circularAngularMomentum,
  circularBracket,
  circularEnergy,
  circularOmega,
  circularSpeed,
  iscoAngularMomentum,
  iscoEnergy,
  iscoRadius,
  marginallyBound,
  photonOrbit,
  type Sense,
} from "@/render/spacetime/orbits";
import { between, seeded, spins } from "../paths/random-rays";

const senses = fc.constantFrom<Sense>("prograde", "retrograde");

describe("circular orbits", () => {
  it("have the numbers of PHYSICS §2 at a = 0.9", () => {
    expect(iscoRadius(0.9, "prograde")).toBeCloseTo(2.32088304176, 11);
    expect(iscoEnergy(0.9, "prograde")).toBeCloseTo(0.844247008006, 12);
    expect(iscoAngularMomentum(0.9, "prograde")).toBeCloseTo(2.09978475612, 11);
    expect(circularSpeed(0.9, 6, "prograde")).toBeCloseTo(0.417065802008, 12);
  });

  it("are timelike unit vectors with the E and L stated: u_t = −E, u_φ = L", () => {
    fc.assert(
      fc.property(spins, senses, between(1.05, 60), (a, sense, times) => {
        const r = photonOrbit(a, sense) * times;
        const g = metric(a, r, 0);
        const omega = circularOmega(a, r, sense);
        const ut = 1 / Math.sqrt(-(g.tt + 2 * g.tphi * omega + g.phph * omega ** 2));
        expect(-ut * (g.tt + g.tphi * omega)).toBeCloseTo(circularEnergy(a, r, sense), 8);
        const angular = circularAngularMomentum(a, r, sense);
        expect((ut * (g.tphi + g.phph * omega)) / angular).toBeCloseTo(1, 8);
      }),
      seeded(500),
    );
  });

  it("are bound most at the innermost stable orbit, where dE/dr = 0, at the smallest spins too", () => {
    fc.assert(
      fc.property(spins, senses, (a, sense) => {
        const r = iscoRadius(a, sense);
        const h = 1e-4 * (r - photonOrbit(a, sense));
        const slope = (circularEnergy(a, r + h, sense) - circularEnergy(a, r - h, sense)) / (2 * h);
        expect(Math.abs(slope)).toBeLessThan(1e-5);
        expect(circularEnergy(a, r, sense)).toBeCloseTo(iscoEnergy(a, sense), 9);
      }),
      seeded(300),
    );
  });

  it("have unit energy on the marginally bound orbit and need infinite energy on the photon orbit", () => {
    fc.assert(
      fc.property(spins, senses, (a, sense) => {
        expect(circularEnergy(a, marginallyBound(a, sense), sense)).toBeCloseTo(1, 9);
        expect(circularBracket(a, photonOrbit(a, sense), sense)).toBeCloseTo(0, 9);
      }),
      seeded(300),
    );
  });
});
