import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { tracePath } from "@/render/paths/tracer";
import { distantCurve, edgeAzimuth, syngeRadius } from "@/render/spacetime/critical-curve";
import {
  oscillation,
  polarPhoton,
  sphericalPhoton,
  sphericalPhotonOf,
} from "@/render/spacetime/spherical-orbits";
import { photonOrbit } from "@/render/spacetime/orbits";
import { radialPotential } from "@/render/paths/motion";
import { between, seeded } from "../paths/random-rays";

const spheres = fc.record({ a: between(0.05, 0.999), part: between(0.02, 0.98) }).map(({ a, part }) => {
  const low = photonOrbit(a, "prograde");
  return { a, r: low + part * (photonOrbit(a, "retrograde") - low) };
});

describe("spherical photon orbits", () => {
  it("have the λ and η of PHYSICS §7 at a = 0.9, r = 2, and Teo's azimuth at a = 1", () => {
    const { lambda, eta } = sphericalPhoton(0.9, 2);
    expect(lambda).toBeCloseTo(1.74444444444, 11);
    expect(eta).toBeCloseTo(12.2469135802, 10);
    expect(polarPhoton(1).r).toBeCloseTo(1 + Math.SQRT2, 12);
    expect(oscillation(1, polarPhoton(1)).azimuth).toBeCloseTo(3.17611875501, 10);
  });

  it("are double roots of the radial potential", () => {
    fc.assert(
      fc.property(spheres, ({ a, r }) => {
        const { lambda, eta } = sphericalPhoton(a, r);
        const potential = (x: number) => radialPotential(a, lambda, eta, 1 / x);
        expect(Math.abs(potential(r))).toBeLessThan(1e-8);
        const h = 1e-4;
        expect(Math.abs(potential(r + h) - potential(r - h)) / (2 * h)).toBeLessThan(1e-5);
      }),
      seeded(300),
    );
  });

  it("are found again from their λ", () => {
    fc.assert(
      fc.property(spheres, ({ a, r }) => {
        expect(sphericalPhotonOf(a, sphericalPhoton(a, r).lambda).r).toBeCloseTo(r, 8);
      }),
      seeded(300),
    );
  });

  it("turn as far, and take as long, per half-oscillation as a traced path that nearly stays there", () => {
    const [a, r] = [0.9, 2.6];
    const { lambda, eta } = sphericalPhoton(a, r);
    const start = { spin: a, rObs: r, cosThetaObs: 0, lambda, eta, signPr: 1, signPtheta: 1 } as const;
    const [first, second] = tracePath(start, { tolerance: 1e-15 }).crossings;
    const orbit = oscillation(a, { r, lambda, eta });
    // Past-directed, so the azimuth runs back; λ < 0 here, and the poles are not gone round.
    expect(second!.dphi - first!.dphi).toBeCloseTo(-orbit.halfAzimuth, 5);
    expect(second!.dt - first!.dt).toBeCloseTo(orbit.halfDelay, 4);
  });
});

describe("the critical curve", () => {
  it("parts captured from escaping light, seen from far away at its left, right and top", () => {
    const [a, cosI] = [0.998, Math.cos((75 * Math.PI) / 180)];
    const sinI = Math.sqrt(1 - cosI * cosI);
    const curve = distantCurve(a, cosI);
    const fateAt = (alpha: number, beta: number) => {
      const lambda = -alpha * sinI;
      const eta = beta * beta - a * a * cosI * cosI + ((lambda * cosI) / sinI) ** 2;
      return tracePath({ spin: a, rObs: Infinity, cosThetaObs: cosI, lambda, eta, signPr: 1, signPtheta: 1 })
        .fate;
    };
    for (const [alpha, beta] of [
      [curve.alphaMin, 1e-9],
      [curve.alphaMax, 1e-9],
      [curve.alphaAtBetaMax, curve.betaMax],
    ] as const) {
      const middle = curve.alphaAtBetaMax;
      expect(fateAt(middle + (alpha - middle) * 0.9999, beta * 0.9999)).toBe("captured");
      expect(fateAt(middle + (alpha - middle) * 1.0001, beta * 1.0001)).toBe("escaped");
    }
  });

  it("is flattened on the left, the approaching side, and shifted to the right (PHYSICS §7)", () => {
    const curve = distantCurve(0.998, 0);
    expect(-curve.alphaMin).toBeLessThan(curve.alphaMax);
  });

  it("spans −25.2° to +58.0° for a near camera of zero angular momentum (PHYSICS §6)", () => {
    const degrees = 180 / Math.PI;
    expect(edgeAzimuth(0.9, 6, 0.5, "prograde") * degrees).toBeCloseTo(-25.2, 1);
    expect(edgeAzimuth(0.9, 6, 0.5, "retrograde") * degrees).toBeCloseTo(58.0, 1);
  });

  it("fills half a held camera's sky at r = 3 (Synge 1966)", () => {
    expect(syngeRadius(3)).toBeCloseTo(Math.PI / 2, 7);
    expect(syngeRadius(2.5)).toBeGreaterThan(Math.PI / 2);
  });
});
