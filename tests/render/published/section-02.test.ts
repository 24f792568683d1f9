// Section 2: the critical curve, from far away and on a near camera's sky (Bardeen 1973; Synge 1966).
import { describe, expect, it } from "vitest";
import {
  distantCurve,
  distantPoint,
  edgeAzimuth,
  edgePhoton,
  schwarzschildCriticalImpact,
  syngeRadius,
} from "@/render/spacetime/critical-curve";
import { createCamera, directionOfPhoton } from "@/render/spacetime/observers";
import type { Sense } from "@/render/spacetime/orbits";
import { sphericalPhoton, sphericalPhotonOf } from "@/render/spacetime/spherical-orbits";
import { checksOf, entriesOf, numberIn, type Entry } from "./entries";

const degrees = 180 / Math.PI;
const spin = (entry: Entry) => numberIn(entry, "a");
const cosOf = (entry: Entry, name: string) => {
  const angle = numberIn(entry, name);
  return angle === 90 ? 0 : Math.cos(angle / degrees);
};

function critical(entry: Entry) {
  const a = spin(entry);
  const cosI = cosOf(entry, "inclination_deg");
  const curve = distantCurve(a, cosI);
  const { points } = entry.expected as unknown as { points: { r_sph: number }[] };
  return {
    alpha_min: curve.alphaMin,
    alpha_max: curve.alphaMax,
    beta_max: curve.betaMax,
    alpha_at_beta_max: curve.alphaAtBetaMax,
    r_sph_at_alpha_min: curve.left.r,
    r_sph_at_alpha_max: curve.right.r,
    area_equivalent_radius: curve.areaRadius,
    points: points.map(({ r_sph }) => {
      const photon = sphericalPhoton(a, r_sph);
      const { alpha, betaAbs } = distantPoint(a, cosI, photon);
      return { r_sph: photon.r, lambda: photon.lambda, eta: photon.eta, alpha, beta_abs: betaAbs };
    }),
  };
}

/** The flatter of the two edges is the one whose curve stays longer near its extreme: a larger radius of curvature. */
function flatSide(entry: Entry) {
  const a = spin(entry);
  const cosI = cosOf(entry, "inclination_deg");
  const curve = distantCurve(a, cosI);
  const span = curve.right.r - curve.left.r;
  const bend = (edge: "left" | "right") => {
    const near = sphericalPhoton(a, curve[edge].r + (edge === "left" ? 1e-3 : -1e-3) * span);
    const { alpha, betaAbs } = distantPoint(a, cosI, near);
    return betaAbs ** 2 / (2 * Math.abs(alpha - (edge === "left" ? curve.alphaMin : curve.alphaMax)));
  };
  const left = -curve.alphaMin;
  const right = curve.alphaMax;
  return {
    left_edge_distance: left,
    right_edge_distance: right,
    flattened_side:
      bend("left") > bend("right") ? "left (approaching, blueshifted side)" : "right (receding side)",
    shadow_centre_shifted_towards: right > left ? "right (receding side)" : "left (approaching side)",
  };
}

function zamoSky(entry: Entry) {
  const a = spin(entry);
  const r = numberIn(entry, "r_obs");
  const cosTheta = cosOf(entry, "theta_obs_deg");
  const camera = createCamera("zero-angular-momentum", a, r, cosTheta);
  const given = entry.expected as unknown as { points_upper_half: { lambda: number }[]; left_edge?: object };
  const points = given.points_upper_half.map(({ lambda }) => {
    const photon = sphericalPhotonOf(a, lambda);
    const [nr, nth, nph] = directionOfPhoton(camera, { ...photon, signPr: 1, signPtheta: 1 });
    return {
      n_r: nr,
      n_theta: nth,
      n_phi: nph,
      angle_from_inward_radial_deg: Math.acos(-nr) * degrees,
      azimuth_right_deg: Math.atan2(nph, -nr) * degrees,
      elevation_up_deg: Math.asin(-nth) * degrees,
      lambda: photon.lambda,
      eta: photon.eta,
    };
  });
  const edge = (sense: Sense) => {
    const { lambda, eta } = edgePhoton(a, cosTheta, sense);
    return {
      azimuth_right_deg: edgeAzimuth(a, r, cosTheta, sense) * degrees,
      elevation_up_deg: 0,
      lambda,
      eta,
    };
  };
  if (!given.left_edge) return { points_upper_half: points };
  return { points_upper_half: points, left_edge: edge("prograde"), right_edge: edge("retrograde") };
}

const checks = checksOf(2, {
  bc: () => schwarzschildCriticalImpact,
  critical,
  flatside: flatSide,
  synge: (entry) => {
    const angle = syngeRadius(numberIn(entry, "r_obs"));
    return { rad: angle, deg: angle * degrees };
  },
  zamosky: zamoSky,
});

describe("published values, section 2", () => {
  it("has all its entries", () => expect(entriesOf(2)).toHaveLength(21));
  for (const { name, run } of checks) it(name, run);
});
