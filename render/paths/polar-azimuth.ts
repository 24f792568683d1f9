// The azimuth a path gains from λ/(1−μ²), which is sharp near the axis and jumps there when λ = 0.
import type { PathWork } from "./path-work";
import { weights } from "../spacetime/quadrature";
import { order, terms } from "./series";

/**
 * ψ = ∫λ/(1−μ²)dτ − ∫λa²μ²/(η+a²μ²)dτ in closed form, for η > 0: tan ψ = λμ/μ', which advances by π from one
 * equatorial crossing to the next. Returned here as |ψ| since the last crossing, in [0, π]; regular on the axis
 * and exact for λ = 0, where it jumps by π. Derived by differentiating arctan(λμ/μ') with μ'² = M, μ'' = M'/2.
 */
export function azimuthOfOrbit(lambda: number, mu: number, muSlope: number): number {
  if (mu === 0) return 0;
  const side = mu > 0 ? 1 : -1;
  return Math.atan2(Math.abs(lambda * mu), side * muSlope);
}

/**
 * ∫λ/(1−μ²)dτ for η ≤ 0, where a path keeps to one hemisphere (or to the equator) and no crossing counts its turns.
 * Towards the axis by the closed form above, away from it directly, whichever integrand is smooth there.
 */
export function addVortical(work: PathWork, at: number, from: number, to: number): void {
  const { motion, series, samples, azimuth } = work;
  const { spin: a, lambda, eta, scale } = motion;
  const start = polarState(series, at, from);
  const end = polarState(series, at, to);
  const middle = 0.5 * (samples[19]! + samples[20]!);
  const nearAxis = a * a > 0 && 2 * a * a * middle * middle >= a * a - eta;

  if (nearAxis) {
    const before = Math.atan2(lambda * start.mu, scale * start.slope);
    const after = Math.atan2(lambda * end.mu, scale * end.slope);
    const turn = after - before;
    const against = lambda < 0 ? turn > 0 : turn < 0;
    azimuth[0] = azimuth[0]! + (against ? turn + (lambda < 0 ? -2 : 2) * Math.PI : turn);
  }
  if (lambda === 0) return;
  let sum = 0;
  for (let i = 0; i < 8; i++) {
    const x = samples[i + 16]! * samples[i + 16]!;
    sum += weights[i]! * (nearAxis ? (lambda * a * a * x) / (eta + a * a * x) : lambda / (1 - x));
  }
  azimuth[0] = azimuth[0]! + (sum * (to - from)) / scale;
}

function polarState(series: Float64Array, at: number, s: number): { mu: number; slope: number } {
  let mu = series[at + terms + order]!;
  let slope = 0;
  for (let k = order - 1; k >= 0; k--) {
    slope = slope * s + mu;
    mu = mu * s + series[at + terms + k]!;
  }
  return { mu, slope };
}
