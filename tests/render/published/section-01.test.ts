// Section 1: horizons, special radii, circular orbits, frame dragging (Bardeen, Press & Teukolsky 1972 and others).
import { describe, expect, it } from "vitest";
import { frameDragging, lapse } from "@/render/spacetime/kerr";
import {
  circularAngularMomentum,
  circularEnergy,
  circularOmega,
  ergosurface,
  horizonAngularVelocity,
  innerHorizon,
  iscoEnergy,
  iscoRadius,
  marginallyBound,
  outerHorizon,
  photonOrbit,
  type Sense,
} from "@/render/spacetime/orbits";
import { checksOf, entriesOf, numberIn, type Entry } from "./entries";

const spin = (entry: Entry) => numberIn(entry, "a");
const radians = (entry: Entry) => (numberIn(entry, "theta_deg") * Math.PI) / 180;

const bothSenses = (law: (a: number, sense: Sense) => number) => (entry: Entry) => ({
  prograde: law(spin(entry), "prograde"),
  retrograde: law(spin(entry), "retrograde"),
});

const efficiency = (a: number, sense: Sense) => 1 - iscoEnergy(a, sense);

const checks = checksOf(1, {
  circEL: (entry) => ({
    E_prograde: circularEnergy(spin(entry), numberIn(entry, "r"), "prograde"),
    L_prograde: circularAngularMomentum(spin(entry), numberIn(entry, "r"), "prograde"),
    E_retrograde: circularEnergy(spin(entry), numberIn(entry, "r"), "retrograde"),
    L_retrograde: circularAngularMomentum(spin(entry), numberIn(entry, "r"), "retrograde"),
  }),
  efficiency: bothSenses(efficiency),
  ergosphere: (entry) => ergosurface(spin(entry), Math.cos(radians(entry))),
  extreme: (entry) => ({
    photon_retrograde: photonOrbit(spin(entry), "retrograde"),
    mb_retrograde: marginallyBound(spin(entry), "retrograde"),
    isco_retrograde: iscoRadius(spin(entry), "retrograde"),
    eff_prograde: efficiency(spin(entry), "prograde"),
    eff_retrograde: efficiency(spin(entry), "retrograde"),
  }),
  horizon: (entry) => ({ r_plus: outerHorizon(spin(entry)), r_minus: innerHorizon(spin(entry)) }),
  isco: bothSenses(iscoRadius),
  mbound: bothSenses(marginallyBound),
  omega: (entry) => ({
    Omega_prograde: circularOmega(spin(entry), numberIn(entry, "r"), "prograde"),
    Omega_retrograde: circularOmega(spin(entry), numberIn(entry, "r"), "retrograde"),
  }),
  omegaH: (entry) => horizonAngularVelocity(spin(entry)),
  photon: bothSenses(photonOrbit),
  thorne: (entry) => efficiency(spin(entry), "prograde"),
  zamo: (entry) => ({
    omega: frameDragging(spin(entry), numberIn(entry, "r"), Math.cos(radians(entry))),
    lapse: lapse(spin(entry), numberIn(entry, "r"), Math.cos(radians(entry))),
  }),
});

describe("published values, section 1", () => {
  it("has all its entries", () => expect(entriesOf(1)).toHaveLength(46));
  for (const { name, run } of checks) it(name, run);
});
