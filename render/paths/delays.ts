// Azimuth and arrival time along a traced path: the integrals of PHYSICS §3, with everything that is singular or
// large taken out in closed form, and the smooth rest summed by Gauss–Legendre quadrature on the steps' own series.
import type { Motion, PathWork } from "./path-work";
import { order, terms } from "./series";

// Gauss–Legendre nodes and weights, eight points on [0, 1] (Abramowitz & Stegun 1964, table 25.4, mapped).
const nodes = new Float64Array([
  0.019855071751231884, 0.10166676129318664, 0.2372337950418355, 0.4082826787521751, 0.5917173212478249,
  0.7627662049581645, 0.8983332387068134, 0.9801449282487681,
]);
const weights = new Float64Array([
  0.05061426814518813, 0.11119051722668724, 0.15685332293894363, 0.181341891689181, 0.181341891689181,
  0.15685332293894363, 0.11119051722668724, 0.05061426814518813,
]);

/** A quadrature stretch is at most this part of the way to the horizon's pole of 1/Δ. */
const reachOfPole = 0.55;

/** Indices into the running sums. */
export const azimuthSum = 0;
export const delaySum = 1;

/**
 * Adds ∫dφ and ∫dt over span[0] … span[1] of the step at `offset`, past-directed, in units where E = 1.
 * φ leaves out ψ, the closed form of ∫λ/(1−μ²) (see `azimuthOfOrbit`), when η > 0.
 */
export function addSpan(work: PathWork, offset: number, withTime: boolean): void {
  const { motion, series, span, sums } = work;
  const to = span[1]!;
  let from = span[0]!;
  if (!(to > from)) return;
  if (motion.spin === 0 && !withTime && motion.eta > 0) return;

  // Near the horizon 1/Δ has its pole just ahead: go there in stretches that shrink with the distance left.
  while (from < to) {
    let u = series[offset + order]!;
    let slope = 0;
    for (let k = order - 1; k >= 0; k--) {
      slope = slope * from + u;
      u = u * from + series[offset + k]!;
    }
    const { force, uHorizon } = motion;
    const bend = Math.abs(u * (force[0]! + u * (force[1]! + u * force[2]!)));
    const left = Math.max(uHorizon - u, 1e-15);
    const pole = (2 * left) / (Math.abs(slope) + Math.sqrt(slope * slope + 2 * left * bend));
    const next = Math.min(to, from + Math.max(reachOfPole * pole, 1e-6 * (to - from)));
    span[0] = from;
    span[1] = next;
    if (withTime) addDelayAndAzimuth(motion, series, offset, span, sums);
    else addAzimuth(motion, series, offset, span, sums);
    if (motion.eta <= 0) addVortical(work, offset);
    from = next;
  }
}

/** Eight-point sum of the azimuth integrand: a u(2−aλu)/D + λa²μ²/(η+a²μ²). */
function addAzimuth(
  motion: Motion,
  series: Float64Array,
  at: number,
  span: Float64Array,
  sums: Float64Array,
) {
  const { spin: a, lambda, eta } = motion;
  const from = span[0]!;
  const length = span[1]! - from;
  const twist = eta > 0 ? lambda * a * a : 0;
  const eta1 = eta > 0 ? eta : 1;
  const a2 = eta > 0 ? a * a : 0;

  let azimuth = 0;
  for (let i = 0; i < 8; i++) {
    const s = from + length * nodes[i]!;
    let u = series[at + order]!;
    let mu = series[at + terms + order]!;
    for (let k = order - 1; k >= 0; k--) {
      u = u * s + series[at + k]!;
      mu = mu * s + series[at + terms + k]!;
    }
    const x = mu * mu;
    const d = 1 + u * (a * a * u - 2);
    const p = eta1 + a2 * x;
    azimuth += (weights[i]! * (a * u * (2 - a * lambda * u) * p + twist * x * d)) / (d * p);
  }
  sums[azimuthSum] = sums[azimuthSum]! + (azimuth * length) / motion.scale;
}

/**
 * The same with the delay, whose 1/u² and 2/u are exact derivatives plus small remainders:
 * ∫1/u² = −[u'/u] + ∫(Bu − Cu²) and ∫2/u = 2σ[ln u] + 2∫q/(1+σu'), q = (1−U)/u, σ = sign u'.
 */
function addDelayAndAzimuth(
  motion: Motion,
  series: Float64Array,
  at: number,
  span: Float64Array,
  sums: Float64Array,
) {
  const { spin: a, lambda, eta, scale } = motion;
  const from = span[0]!;
  const length = span[1]! - from;
  const twist = eta > 0 ? lambda * a * a : 0;
  const eta1 = eta > 0 ? eta : 1;
  const a2 = eta > 0 ? a * a : 0;

  const b = eta + (lambda - a) * (lambda - a);
  const c = a * a * eta;
  const inwards = lambda * lambda + eta - a * a;
  const n0 = 4 + a * a - a * lambda;
  const n2 = a * a * a * (a - lambda);
  const sigma = slopeSign(series, at, from + 0.5 * length);

  let azimuth = 0;
  let delay = 0;
  for (let i = 0; i < 8; i++) {
    const s = from + length * nodes[i]!;
    let u = series[at + order]!;
    let slope = 0;
    let mu = series[at + terms + order]!;
    for (let k = order - 1; k >= 0; k--) {
      slope = slope * s + u;
      u = u * s + series[at + k]!;
      mu = mu * s + series[at + terms + k]!;
    }
    const x = mu * mu;
    const d = 1 + u * (a * a * u - 2);
    const p = eta1 + a2 * x;
    azimuth += (weights[i]! * (a * u * (2 - a * lambda * u) * p + twist * x * d)) / (d * p);
    const polynomial = a * lambda - a * a * (1 - x) + u * (b - c * u);
    const e = 1 + sigma * scale * slope;
    const remainder = 2 * u * (inwards - u * (2 * b - c * u));
    delay += weights[i]! * (polynomial + ((n0 + u * (n2 * u - 2 * a * a)) * e + remainder * d) / (d * e));
  }
  sums[azimuthSum] = sums[azimuthSum]! + (azimuth * length) / scale;
  sums[delaySum] = sums[delaySum]! + (delay * length) / scale + boundaryTerms(series, at, span, sigma, scale);
}

/** −[u'/u] + 2σ[ln u] over the span. */
function boundaryTerms(series: Float64Array, at: number, span: Float64Array, sigma: number, scale: number) {
  let total = 0;
  let ratio = 1;
  for (let end = 0; end < 2; end++) {
    const s = span[end]!;
    let u = series[at + order]!;
    let slope = 0;
    for (let k = order - 1; k >= 0; k--) {
      slope = slope * s + u;
      u = u * s + series[at + k]!;
    }
    total += (end === 0 ? 1 : -1) * ((scale * slope) / u);
    ratio = end === 0 ? 1 / u : ratio * u;
  }
  return total + 2 * sigma * Math.log(ratio);
}

function slopeSign(series: Float64Array, at: number, s: number): number {
  let slope = order * series[at + order]!;
  for (let k = order - 1; k >= 1; k--) slope = slope * s + k * series[at + k]!;
  return slope < 0 ? -1 : 1;
}

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
function addVortical(work: PathWork, at: number): void {
  const { motion, series, span, sums } = work;
  const { spin: a, lambda, eta, scale } = motion;
  const from = span[0]!;
  const length = span[1]! - from;
  const ends = [polarState(series, at, from), polarState(series, at, span[1]!)] as const;
  const middle = polarState(series, at, from + 0.5 * length);
  const nearAxis = a > 0 && 2 * a * a * middle.mu * middle.mu >= a * a - eta;

  if (nearAxis) {
    const before = Math.atan2(lambda * ends[0].mu, scale * ends[0].slope);
    const after = Math.atan2(lambda * ends[1].mu, scale * ends[1].slope);
    const turn = after - before;
    const against = lambda < 0 ? turn > 0 : turn < 0;
    sums[azimuthSum] = sums[azimuthSum]! + (against ? turn + (lambda < 0 ? -2 : 2) * Math.PI : turn);
  }
  if (lambda === 0) return;
  let azimuth = 0;
  for (let i = 0; i < 8; i++) {
    const { mu } = polarState(series, at, from + length * nodes[i]!);
    const x = mu * mu;
    azimuth += weights[i]! * (nearAxis ? (lambda * a * a * x) / (eta + a * a * x) : lambda / (1 - x));
  }
  sums[azimuthSum] = sums[azimuthSum]! + (azimuth * length) / scale;
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
