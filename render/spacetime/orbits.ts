// Horizons, special radii and circular equatorial orbits of the Kerr spacetime.
// Symbols follow Bardeen, Press & Teukolsky 1972 (ApJ 178, 347), cited below as BPT. Units G = c = M = 1.

/** The direction of an equatorial orbit with respect to the hole's rotation. */
export type Sense = "prograde" | "retrograde";

/** The ± of BPT's circular-orbit formulas: +1 prograde, −1 retrograde. */
export function senseSign(sense: Sense): 1 | -1 {
  return sense === "prograde" ? 1 : -1;
}

/** Outer horizon r₊ = 1 + √(1−a²), in M (Boyer & Lindquist 1967). Domain 0 ≤ a ≤ 1. */
export function outerHorizon(a: number): number {
  return 1 + Math.sqrt((1 - a) * (1 + a));
}

/** Inner horizon r₋ = 1 − √(1−a²), in M, formed as a²/r₊ so that no digits cancel. Domain 0 ≤ a ≤ 1. */
export function innerHorizon(a: number): number {
  return (a * a) / outerHorizon(a);
}

/** Outer ergosurface r = 1 + √(1 − a²cos²θ), in M: the root of g_tt = 0 (BPT §II). Domain 0 ≤ a ≤ 1. */
export function ergosurface(a: number, cosTheta: number): number {
  const along = a * cosTheta;
  return 1 + Math.sqrt((1 - along) * (1 + along));
}

/** Angular velocity of the horizon Ω_H = a/(2r₊), in 1/M (BPT §II). Domain 0 ≤ a ≤ 1. */
export function horizonAngularVelocity(a: number): number {
  return a / (2 * outerHorizon(a));
}

/** Circular photon orbit r_ph = 2{1 + cos[⅔ arccos(∓a)]}, in M (BPT eq. 2.18). Domain 0 ≤ a ≤ 1. */
export function photonOrbit(a: number, sense: Sense): number {
  return 2 * (1 + Math.cos((2 / 3) * Math.acos(-senseSign(sense) * a)));
}

/** Marginally bound orbit r_mb = 2 ∓ a + 2√(1 ∓ a), in M (BPT eq. 2.19). Domain 0 ≤ a ≤ 1. */
export function marginallyBound(a: number, sense: Sense): number {
  const s = senseSign(sense);
  return 2 - s * a + 2 * Math.sqrt(1 - s * a);
}

/**
 * Innermost stable circular orbit, in M (BPT eq. 2.21). With c, d = ∛(1±a), 3 − Z₁ = (c−d)²(c+d) and
 * c − d = 2a/(c²+cd+d²), so that no digits cancel at small spins. Domain 0 ≤ a ≤ 1.
 */
export function iscoRadius(a: number, sense: Sense): number {
  const c = Math.cbrt(1 + a);
  const d = Math.cbrt(1 - a);
  const z1 = 1 + c * d * (c + d);
  const z2 = Math.sqrt(3 * a * a + z1 * z1);
  const apart = (2 * a) / (c * c + c * d + d * d);
  return 3 + z2 - senseSign(sense) * apart * Math.sqrt((c + d) * (3 + z1 + 2 * z2));
}

/** Energy per rest mass on the innermost stable orbit, √(1 − 2/(3 r_isco)) (BPT §II). Domain 0 ≤ a ≤ 1. */
export function iscoEnergy(a: number, sense: Sense): number {
  return Math.sqrt(1 - 2 / (3 * iscoRadius(a, sense)));
}

/** Angular momentum per rest mass on the innermost stable orbit, in M; negative when retrograde (BPT eq. 2.13). */
export function iscoAngularMomentum(a: number, sense: Sense): number {
  return circularAngularMomentum(a, iscoRadius(a, sense), sense);
}

/** Coordinate angular velocity dφ/dt = ±1/(r^{3/2} ± a), in 1/M (BPT eq. 2.16). Domain r > 0. */
export function circularOmega(a: number, r: number, sense: Sense): number {
  const s = senseSign(sense);
  return s / (r * Math.sqrt(r) + s * a);
}

/**
 * The bracket 1 − 3/r ± 2a r^{−3/2} under the root of BPT eqs. 2.12–2.13, dimensionless.
 * It vanishes on the photon orbit and is positive outside it: timelike circular orbits need it positive.
 */
export function circularBracket(a: number, r: number, sense: Sense): number {
  return 1 - 3 / r + (2 * senseSign(sense) * a) / (r * Math.sqrt(r));
}

/** Energy per rest mass, (1 − 2/r ± a r^{−3/2})/√(1 − 3/r ± 2a r^{−3/2}) (BPT eq. 2.12). Domain r > r_ph, else NaN. */
export function circularEnergy(a: number, r: number, sense: Sense): number {
  const numerator = 1 - 2 / r + (senseSign(sense) * a) / (r * Math.sqrt(r));
  return numerator / Math.sqrt(circularBracket(a, r, sense));
}

/** Angular momentum per rest mass, in M; negative when retrograde (BPT eq. 2.13). Domain r > r_ph, else NaN. */
export function circularAngularMomentum(a: number, r: number, sense: Sense): number {
  const s = senseSign(sense);
  const root = Math.sqrt(r);
  return (s * (r * r - 2 * s * a * root + a * a)) / (r * root * Math.sqrt(circularBracket(a, r, sense)));
}

/** Speed of a circular orbit measured by a zero-angular-momentum observer, in c, signed like φ (BPT eq. 3.10). */
export function circularSpeed(a: number, r: number, sense: Sense): number {
  const s = senseSign(sense);
  const root = Math.sqrt(r);
  const delta = r * r - 2 * r + a * a;
  return (s * (r * r - 2 * s * a * root + a * a)) / (Math.sqrt(delta) * (r * root + s * a));
}
