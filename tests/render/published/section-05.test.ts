// Section 5: photon rings (Gralla, Holz & Wald 2019; Johnson et al. 2020).
import { describe, expect, it } from "vitest";
import { tracePath } from "@/render/paths/tracer";
import { bisect, oscillation, polarPhoton, sphericalPhoton } from "@/render/spacetime/spherical-orbits";
import { checksOf, entriesOf, numberIn, type Entry } from "./entries";

/** Steps near machine precision, which paths near the critical curve may use (PHYSICS §14). */
const fine = { tolerance: 1e-15 };

/** The path of impact parameter b to a face-on observer at infinity on the axis, a = 0. */
const faceOn = (b: number) =>
  tracePath(
    { spin: 0, rObs: Infinity, cosThetaObs: 1, lambda: 0, eta: b * b, signPr: 1, signPtheta: -1 },
    fine,
  );

const crossings = (b: number) => faceOn(b).equatorial_crossings_total;

/** The edges of the intervals of b whose light crosses the disk at least twice and at least three times. */
function rings() {
  const between = (low: number, high: number, count: number) =>
    bisect(low, high, (b) => (crossings(b) >= count ? 1 : -1));
  return {
    lensing_ring_inner: between(4, 5.19, 2),
    lensing_ring_outer: between(5.21, 8, 2),
    photon_ring_inner: between(5.1, 5.196, 3),
    photon_ring_outer: between(5.1965, 5.5, 3),
  };
}

function transfer(entry: Entry) {
  const path = faceOn(numberIn(entry, "b"));
  return Object.fromEntries(path.crossings.map(({ r }, k) => [`r_${k + 1}`, r]));
}

function lyapunov(entry: Entry) {
  const a = numberIn(entry, "a");
  const photon = a === 0 ? polarPhoton(0) : sphericalPhoton(a, numberIn(entry, "r_sph"));
  const orbit = oscillation(a, photon);
  return {
    gamma: orbit.lyapunov,
    "exp(-gamma)": Math.exp(-orbit.lyapunov),
    delta: orbit.halfAzimuth,
    tau: orbit.halfDelay,
    lambda: photon.lambda,
    eta: photon.eta,
  };
}

const checks = checksOf(5, { ghw: rings, lyapunov, transfer });

describe("published values, section 5", () => {
  it("has all its entries", () => expect(entriesOf(5)).toHaveLength(17));
  for (const { name, run } of checks) it(name, run);
});
