// Section 3: spherical photon orbits (Teo 2003).
import { describe, expect, it } from "vitest";
import { photonOrbit } from "@/render/spacetime/orbits";
import { oscillation, polarPhoton, sphericalPhoton } from "@/render/spacetime/spherical-orbits";
import { checksOf, entriesOf, expectWithin, numberIn, type Entry } from "./entries";

const degrees = 180 / Math.PI;
const spin = (entry: Entry) => numberIn(entry, "a");

function polar(entry: Entry) {
  const a = spin(entry);
  const photon = polarPhoton(a);
  return {
    r: photon.r,
    eta: photon.eta,
    dphi_drift: oscillation(a, photon).azimuth,
    "sqrt(eta+a^2)": Math.sqrt(photon.eta + a * a),
  };
}

function teo(entry: Entry) {
  const photon = sphericalPhoton(spin(entry), numberIn(entry, "r"));
  const orbit = oscillation(spin(entry), photon);
  return {
    lambda: photon.lambda,
    eta: photon.eta,
    dphi_per_oscillation: orbit.azimuth,
    mino_period: orbit.minoPeriod,
    max_latitude_deg: Math.asin(orbit.cosThetaMax) * degrees,
  };
}

/**
 * At r = 1+√2 the exact λ is zero and the file gives what 40 digits leave of it, 9·10⁻⁴¹: its zero is checked on λ's
 * own scale, √η, and then stands in for the file's.
 */
function extreme(entry: Entry) {
  const r = numberIn(entry, "r");
  const given = entry.expected as { lambda: number };
  const through = sphericalPhoton(spin(entry), r);
  const atPole = Math.abs(given.lambda) < 1e-30;
  if (atPole) {
    const scale = Math.sqrt(through.eta);
    expectWithin(entry, "lambda on the scale of √η", through.lambda + scale, scale);
    expectWithin(entry, "radius of the polar orbit", polarPhoton(spin(entry)).r, r);
  }
  const photon = atPole ? polarPhoton(spin(entry)) : through;
  return {
    lambda: atPole ? given.lambda : photon.lambda,
    eta: photon.eta,
    dphi: oscillation(spin(entry), photon).azimuth,
  };
}

const checks = checksOf(3, {
  polar,
  teo,
  teoa1: extreme,
  range: (entry) => ({
    r_min: photonOrbit(spin(entry), "prograde"),
    r_max: photonOrbit(spin(entry), "retrograde"),
  }),
});

describe("published values, section 3", () => {
  it("has all its entries", () => expect(entriesOf(3)).toHaveLength(18));
  for (const { name, run } of checks) it(name, run);
});
