import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  axialRadius,
  bigA,
  delta,
  frameDragging,
  lapse,
  metric,
  sigma,
  sinSquared,
} from "@/render/spacetime/kerr";
import { outerHorizon } from "@/render/spacetime/orbits";
import { between, seeded, spins } from "../paths/random-rays";

const places = fc
  .record({ a: spins, above: between(1e-3, 50), cosTheta: between(-0.99, 0.99) })
  .map(({ a, above, cosTheta }) => ({ a, r: outerHorizon(a) + above, cosTheta }));

describe("the metric", () => {
  it("has the numbers of PHYSICS §1 at a = 0.9, r = 6, 60°", () => {
    const cosTheta = Math.cos(Math.PI / 3);
    expect(sigma(0.9, 6, cosTheta)).toBeCloseTo(36.2025, 12);
    expect(delta(0.9, 6)).toBeCloseTo(24.81, 12);
    expect(bigA(0.9, 6, cosTheta)).toBeCloseTo(1339.904025, 9);
    expect(frameDragging(0.9, 6, cosTheta)).toBeCloseTo(0.00806027879497, 14);
    expect(lapse(0.9, 6, cosTheta)).toBeCloseTo(0.818739639498, 12);
    expect(axialRadius(0.9, 6, cosTheta)).toBeCloseTo(5.26863601719, 11);
  });

  it("has g_tφ² − g_tt g_φφ = Δ sin²θ everywhere", () => {
    fc.assert(
      fc.property(places, ({ a, r, cosTheta }) => {
        const g = metric(a, r, cosTheta);
        const expected = delta(a, r) * sinSquared(cosTheta);
        expect((g.tphi ** 2 - g.tt * g.phph) / expected).toBeCloseTo(1, 9);
      }),
      seeded(500),
    );
  });

  it("drags at −g_tφ/g_φφ and slows clocks by the lapse", () => {
    fc.assert(
      fc.property(places, ({ a, r, cosTheta }) => {
        const g = metric(a, r, cosTheta);
        expect(frameDragging(a, r, cosTheta)).toBeCloseTo(-g.tphi / g.phph, 12);
        const square = g.tphi ** 2 / g.phph - g.tt;
        expect(lapse(a, r, cosTheta) ** 2).toBeCloseTo(square, 10);
      }),
      seeded(500),
    );
  });

  it("is Schwarzschild's at a = 0", () => {
    const g = metric(0, 8, 0.3);
    expect(g.tt).toBe(-(1 - 2 / 8));
    expect(g.rr).toBeCloseTo(1 / (1 - 2 / 8), 15);
    expect(g.phph).toBeCloseTo(64 * sinSquared(0.3), 12);
    expect(g.tphi).toBeCloseTo(0, 15);
  });
});
