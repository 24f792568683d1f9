// Photons that stay at one radius (Teo 2003, Gen. Rel. Grav. 35, 1909; Bardeen 1973): the light whose constants make
// the edge of the shadow. Units G = c = M = 1.
import { completeK, completePi, completeSnSquared } from "./carlson";
import { delta } from "./kerr";
import { photonOrbit } from "./orbits";

export interface SphericalPhoton {
  r: number;
  lambda: number;
  eta: number;
}

/**
 * λ = a + (r/a)[r − 2Δ/(r−1)] and η = (r³/a²)[4Δ/(r−1)² − r] of the spherical orbit of radius r
 * (Bardeen 1973; Teo 2003), λ over one denominator. Domain 0 < a ≤ 1, r between the two photon orbits.
 */
export function sphericalPhoton(a: number, r: number): SphericalPhoton {
  const lambda = (r * r * (3 - r) - a * a * (r + 1)) / (a * (r - 1));
  const eta = (r ** 3 * (4 * a * a - r * (r - 3) ** 2)) / (a * a * (r - 1) ** 2);
  return { r, lambda, eta };
}

/** The orbit through the poles, λ = 0: r = 1 + 2√(1−a²/3) cos{⅓ arccos[(1−a²)/(1−a²/3)^{3/2}]} (Teo 2003). */
export function polarPhoton(a: number): SphericalPhoton {
  const third = 1 - (a * a) / 3;
  const r = 1 + 2 * Math.sqrt(third) * Math.cos(Math.acos((1 - a * a) / (third * Math.sqrt(third))) / 3);
  if (a === 0) return { r: 3, lambda: 0, eta: 27 };
  return { ...sphericalPhoton(a, r), lambda: 0 };
}

/** The spherical orbit of a given λ, by bisection: λ falls as r grows. Every λ² ≤ 27 has r = 3 when a = 0. */
export function sphericalPhotonOf(a: number, lambda: number): SphericalPhoton {
  if (a === 0) return { r: 3, lambda, eta: 27 - lambda * lambda };
  const low = photonOrbit(a, "prograde");
  const high = photonOrbit(a, "retrograde");
  return sphericalPhoton(
    a,
    bisect(low, high, (r) => sphericalPhoton(a, r).lambda - lambda),
  );
}

/** The root of `f`, which is positive at `low` and negative at `high` or the other way round, to rounding. */
export function bisect(low: number, high: number, f: (x: number) => number): number {
  const positive = f(low) > 0;
  let [left, right] = [low, high];
  for (let round = 0; round < 200; round++) {
    const middle = 0.5 * (left + right);
    if (middle === left || middle === right) return middle;
    if (f(middle) > 0 === positive) left = middle;
    else right = middle;
  }
  return 0.5 * (left + right);
}

export interface Oscillation {
  /** Mino time of a full oscillation in latitude, 4K/w, in 1/M. */
  minoPeriod: number;
  /** Greatest |cos θ|. */
  cosThetaMax: number;
  /** Azimuth per full oscillation, without the jumps at the poles that λ = 0 would add. */
  azimuth: number;
  /** Lyapunov exponent, azimuth and delay (M) of half an oscillation. */
  lyapunov: number;
  halfAzimuth: number;
  halfDelay: number;
}

/**
 * One oscillation in latitude of a spherical orbit, by complete elliptic integrals (Teo 2003; Johnson et al. 2020
 * for the Lyapunov exponent; Gralla & Lupsasca 2020 for the delay). With b = η+λ²−a², w² = (b+√(b²+4a²η))/2,
 * μ₊² = η/w², m = −a²η/w⁴: Δφ = (4/w)[a(2r−aλ)K/Δ + λΠ(μ₊²|m)], γ = (4r/w)√(1−Δ/(r(r−1)²)) K. Domain η > 0.
 */
export function oscillation(a: number, { r, lambda, eta }: SphericalPhoton): Oscillation {
  const b = eta + lambda * lambda - a * a;
  const w2 = 0.5 * (b + Math.sqrt(b * b + 4 * a * a * eta));
  const w = Math.sqrt(w2);
  const m = (-a * a * eta) / (w2 * w2);
  const k = completeK(m);
  const d = delta(a, r);
  const polar = lambda === 0 ? 0 : lambda * completePi(eta / w2, m);
  const azimuth = (4 / w) * ((a * (2 * r - a * lambda) * k) / d + polar);

  const rr = r * r + a * a;
  const steady = (rr * (rr - a * lambda)) / d + a * lambda - a * a;
  const halfDelay = (2 / w) * (steady * k + (a * a * eta * completeSnSquared(m)) / w2);
  return {
    minoPeriod: (4 * k) / w,
    cosThetaMax: Math.sqrt(eta / w2),
    azimuth,
    lyapunov: ((4 * r) / w) * Math.sqrt(1 - d / (r * (r - 1) ** 2)) * k,
    halfAzimuth: 0.5 * azimuth,
    halfDelay,
  };
}
