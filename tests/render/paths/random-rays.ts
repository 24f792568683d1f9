// Seeded photons for the path tests: any spin, camera and direction, near the hole as well as far.
import fc from "fast-check";
import type { PathStart } from "@/render/paths/light-path";
import { createCamera, createReceivedPhoton, receivePhoton } from "@/render/spacetime/observers";
import { outerHorizon } from "@/render/spacetime/orbits";

/** Evenly over an interval; fast-check's own doubles prefer 10⁻³²⁰, which no camera is at. */
export const between = (min: number, max: number) =>
  fc.integer({ min: 0, max: 2 ** 30 }).map((step) => min + (max - min) * (step / 2 ** 30));

export const spins = fc.oneof(fc.constantFrom(0, 0.6, 0.9, 0.998, 0.9999), between(0, 0.9999));

/** cos θ of a camera: on the equator, on and near both axes, and anywhere. */
const latitudes = fc.oneof(fc.constantFrom(0, 1, -1, 0.5, -0.5, Math.cos(1e-3)), between(-1, 1));

/** A photon received by a zero-angular-momentum camera, at `clearance` or more horizon radii. */
export function photons(clearance = 1.001): fc.Arbitrary<PathStart> {
  return fc
    .record({
      a: spins,
      decades: between(0, 5),
      cosTheta: latitudes,
      nr: between(-1, 1),
      nth: between(-1, 1),
      nph: between(-1, 1),
    })
    .filter(({ nr, nth, nph }) => nr * nr + nth * nth + nph * nph > 1e-3)
    .map(({ a, decades, cosTheta, nr, nth, nph }) => {
      const radius = outerHorizon(a) * (clearance + 10 ** decades - 1);
      const photon = createReceivedPhoton();
      // Directions towards the hole, where paths bend, as often as away from it.
      const narrow = nr < 0 && radius > 20 ? 12 / radius : 1;
      const camera = createCamera("zero-angular-momentum", a, radius, cosTheta);
      receivePhoton(camera, nr, narrow * nth, narrow * nph, photon);
      const { lambda, eta, signPr, signPtheta } = photon;
      return { spin: a, rObs: radius, cosThetaObs: cosTheta, lambda, eta, signPr, signPtheta };
    });
}

/** fast-check runs are reproducible: one seed for the whole suite. */
export const seeded = (numRuns: number) => ({ seed: 20_260_101, numRuns });

export const foldAngle = (phi: number) => phi - 2 * Math.PI * Math.ceil(phi / (2 * Math.PI) - 0.5);
