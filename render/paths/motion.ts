// From a received photon to the equations of its path. Symbols as in PHYSICS §3: u = 1/r, μ = cos θ, Mino time τ.
// Carter 1968 (Phys. Rev. 174, 1559); Gralla & Lupsasca 2020 (arXiv:1910.12881).
import { outerHorizon } from "../spacetime/orbits";
import type { PathStart } from "./light-path";
import type { PathWork } from "./path-work";
import { terms } from "./series";

/** Closer to the equator than this, a camera is on it: no crossing is counted at its own place. */
export const equatorWidth = 1e-15;

/** A potential this far below zero, relative to its own terms, is rounding at a turning point. */
const roundingBelowZero = 1e-9;

/** A positive η below this keeps a path at its latitude for ever; as zero it cannot underflow in a quotient. */
const smallestEta = 1e-200;

/** U(u) = u'² per unit τ: 1 + (a²−λ²−η)u² + 2[η+(λ−a)²]u³ − a²ηu⁴. Dimensionless. */
export function radialPotential(a: number, lambda: number, eta: number, u: number): number {
  const bending = eta + (lambda - a) * (lambda - a);
  return 1 + u * u * (a * a - lambda * lambda - eta + u * (2 * bending - a * a * eta * u));
}

/** M(μ) = μ'² per unit τ: (1−μ²)(η+a²μ²) − λ²μ², formed so that it keeps its digits near the axis. In M². */
export function polarPotential(a: number, lambda: number, eta: number, mu: number): number {
  const x = mu * mu;
  return (1 - mu) * (1 + mu) * (eta + a * a * x) - lambda * lambda * x;
}

/** dt/dτ for unit energy; its sign at the observer is that of the photon's energy at infinity. In M². */
function timeRate(a: number, lambda: number, r: number, mu: number): number {
  const rr = r * r + a * a;
  const delta = r * r - 2 * r + a * a;
  return (rr * (rr - a * lambda)) / delta + a * lambda - a * a * (1 - mu) * (1 + mu);
}

/** The square root of a potential that rounding may have taken below zero; NaN when no such path exists. */
function rootOf(potential: number, largestTerm: number): number {
  if (potential >= 0) return Math.sqrt(potential);
  return potential >= -roundingBelowZero * largestTerm ? 0 : NaN;
}

/**
 * Writes the path's constants and its first state (u, du/ds, μ, dμ/ds) into `work`. Past-directed, so
 * u' = +sign(p_r)√U and μ' = +sign(p_θ)√M. Returns false when no such path exists (camera not outside the
 * horizon, forbidden λ and η, or a number that is not finite).
 */
export function setMotion(start: PathStart, work: PathWork): boolean {
  const { spin: a, rObs, lambda } = start;
  const eta = start.eta > 0 && start.eta < smallestEta ? 0 : start.eta;
  const { motion, series } = work;
  const { force } = motion;
  const mu0 = Math.abs(start.cosThetaObs) < equatorWidth ? 0 : start.cosThetaObs;
  const u0 = 1 / rObs;
  const scaleSquared = eta + lambda * lambda + a * a + 1;
  if (!(rObs > outerHorizon(a)) || !(Math.abs(mu0) <= 1) || !(scaleSquared > 0 && scaleSquared < 1e300))
    return false;

  const scale = Math.sqrt(scaleSquared);
  motion.spin = a;
  motion.lambda = lambda;
  motion.eta = eta;
  motion.scale = scale;
  motion.uHorizon = 1 / outerHorizon(a);
  motion.energySign = timeRate(a, lambda, rObs, mu0) < 0 ? -1 : 1;
  motion.polarTwist = eta > 0 ? lambda * a * a : 0;
  motion.polarBase = eta > 0 ? eta : 1;
  motion.polarSquare = eta > 0 ? a * a : 0;

  const perScale = 1 / scaleSquared;
  const bending = eta + (lambda - a) * (lambda - a);
  force[0] = (a * a - lambda * lambda - eta) * perScale;
  force[1] = 3 * bending * perScale;
  force[2] = -2 * a * a * eta * perScale;
  force[3] = (a * a - lambda * lambda - eta) * perScale;
  force[4] = 0;
  force[5] = -2 * a * a * perScale;

  const radial = rootOf(radialPotential(a, lambda, eta, u0), 1 + scaleSquared * u0 * u0);
  const polar = rootOf(polarPotential(a, lambda, eta, mu0), scaleSquared);
  series[0] = u0;
  series[1] = (start.signPr * radial) / scale;
  series[terms] = mu0;
  series[terms + 1] = (start.signPtheta * polar) / scale;
  return radial === radial && polar === polar;
}
