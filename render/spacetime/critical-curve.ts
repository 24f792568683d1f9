// The critical curve: where on the sky light from near the spherical photon orbits arrives; the edge of the shadow.
// Bardeen 1973 (Les Houches) for a distant observer, Synge 1966 (MNRAS 131, 463) for a held one at a = 0.
// Screen: α grows to the right (+e_φ), β up (−e_θ); see PHYSICS §7 for which side is flat.
import { axialRadius, delta, frameDragging, lapse, sinSquared } from "./kerr";
import { photonOrbit, type Sense } from "./orbits";
import { bisect, polarPhoton, sphericalPhoton, type SphericalPhoton } from "./spherical-orbits";

/** β² = η + a²cos²i − λ²cot²i of a distant observer, in M²; also Θ at any observer. */
function betaSquared(a: number, cosTheta: number, { lambda, eta }: SphericalPhoton): number {
  const mu2 = cosTheta * cosTheta;
  return eta + a * a * mu2 - (lambda * lambda * mu2) / sinSquared(cosTheta);
}

/** Impact parameter √27 M of the critical curve at a = 0. */
export const schwarzschildCriticalImpact = Math.sqrt(27);

/** A point of the curve seen from far away at inclination i: α = −λ/sin i, β = ±√(β²), in M (Bardeen 1973). */
export function distantPoint(a: number, cosTheta: number, photon: SphericalPhoton) {
  return {
    alpha: -photon.lambda / Math.sqrt(sinSquared(cosTheta)),
    betaAbs: Math.sqrt(Math.max(0, betaSquared(a, cosTheta, photon))),
  };
}

/**
 * The spherical orbit seen at the curve's edge at the level of the hole's centre: p_θ = 0 at the observer. The
 * prograde edge is the left one. Domain 0 < a ≤ 1, observer off the axis.
 */
export function edgePhoton(a: number, cosTheta: number, edge: Sense): SphericalPhoton {
  const end = photonOrbit(a, edge);
  const height = (r: number) => betaSquared(a, cosTheta, sphericalPhoton(a, r));
  if (cosTheta === 0) return { ...sphericalPhoton(a, end), eta: 0 };
  return sphericalPhoton(a, bisect(polarPhoton(a).r, end, height));
}

export interface DistantCurve {
  left: SphericalPhoton;
  right: SphericalPhoton;
  alphaMin: number;
  alphaMax: number;
  betaMax: number;
  alphaAtBetaMax: number;
  /** Radius of the circle of the same area. */
  areaRadius: number;
}

/**
 * The whole curve seen from far away, in M. Its top is where dβ²/dλ = 0; along the curve R = R' = 0 gives
 * dη/dλ = −2a(r²+a²−aλ)/Δ − 2(λ−a). Domain 0 < a ≤ 1, off the axis.
 */
export function distantCurve(a: number, cosTheta: number): DistantCurve {
  const left = edgePhoton(a, cosTheta, "prograde");
  const right = edgePhoton(a, cosTheta, "retrograde");
  const cot2 = (cosTheta * cosTheta) / sinSquared(cosTheta);
  const slope = (r: number) => {
    const { lambda } = sphericalPhoton(a, r);
    const etaSlope = (-2 * a * (r * r + a * a - a * lambda)) / delta(a, r) - 2 * (lambda - a);
    return etaSlope - 2 * lambda * cot2;
  };
  const top = distantPoint(a, cosTheta, sphericalPhoton(a, bisect(left.r, right.r, slope)));
  return {
    left,
    right,
    alphaMin: distantPoint(a, cosTheta, left).alpha,
    alphaMax: distantPoint(a, cosTheta, right).alpha,
    betaMax: top.betaAbs,
    alphaAtBetaMax: top.alpha,
    areaRadius: Math.sqrt(enclosedArea(a, cosTheta, left.r, right.r) / Math.PI),
  };
}

/** 2∫β dα over r = middle − half·cos t, which makes the integrand periodic, so that equal steps in t converge fast. */
function enclosedArea(a: number, cosTheta: number, low: number, high: number): number {
  const count = 512;
  const sinI = Math.sqrt(sinSquared(cosTheta));
  let sum = 0;
  for (let k = 1; k < count; k++) {
    const t = (Math.PI * k) / count;
    const r = 0.5 * (low + high) - 0.5 * (high - low) * Math.cos(t);
    const numerator = r * r * (3 - r) - a * a * (r + 1);
    const numeratorSlope = 6 * r - 3 * r * r - a * a;
    const alphaSlope = -(numeratorSlope * (r - 1) - numerator) / (a * (r - 1) ** 2 * sinI);
    const { betaAbs } = distantPoint(a, cosTheta, sphericalPhoton(a, r));
    sum += betaAbs * alphaSlope * Math.sin(t);
  }
  return (Math.PI / count) * (high - low) * sum;
}

/**
 * Angular radius of the shadow for a held observer at a = 0, in radians: sin ψ = √27 √(1−2/r)/r, more than a right
 * angle inside r = 3 (Synge 1966). Domain r > 2.
 */
export function syngeRadius(r: number): number {
  const fromSide = Math.asin(Math.min(1, (schwarzschildCriticalImpact * Math.sqrt(1 - 2 / r)) / r));
  return r < 3 ? Math.PI - fromSide : fromSide;
}

/**
 * Azimuth to the right, in radians, at which a zero-angular-momentum camera at r sees the curve's edge at the level
 * of the hole's centre: sin = −λα/[√g_φφ(1−ωλ)] with p_θ = 0. Domain 0 < a ≤ 1, off the axis, r outside the orbit.
 */
export function edgeAzimuth(a: number, r: number, cosTheta: number, edge: Sense): number {
  const { lambda } = edgePhoton(a, cosTheta, edge);
  const dragged = 1 - frameDragging(a, r, cosTheta) * lambda;
  return Math.asin((-lambda * lapse(a, r, cosTheta)) / (axialRadius(a, r, cosTheta) * dragged));
}
