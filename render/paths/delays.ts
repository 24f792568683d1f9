// Azimuth and arrival time along a traced path: the integrals of PHYSICS §3, with everything that is singular or
// large taken out in closed form, and the smooth rest summed by Gauss–Legendre quadrature on the steps' own series.
import { addVortical } from "./polar-azimuth";
import { nodes, weights } from "../spacetime/quadrature";
import type { PathWork } from "./path-work";
import { order, terms } from "./series";

/** A quadrature stretch is at most this part of the way to the horizon's pole of 1/Δ. */
const reachOfPole = 0.55;

/** Empties the running sums before a path. */
export function clearSums(work: PathWork): void {
  work.azimuth[0] = 0;
  work.delay[0] = 0;
  work.ratio[0] = 1;
}

/**
 * Adds ∫dφ and ∫dt over span[0] … span[1] of the step at `offset`, past-directed, in units where E = 1.
 * φ leaves out the closed form ψ of `azimuthOfOrbit` when η > 0; t leaves out −[u'/u] and the logarithm of `ratio`.
 */
export function addSpan(work: PathWork, offset: number, withTime: boolean): void {
  const { motion, span } = work;
  const to = span[1]!;
  let from = span[0]!;
  if (!(to > from) || (motion.spin === 0 && !withTime && motion.eta > 0)) return;

  // Near the horizon 1/Δ has its pole just ahead: go there in stretches that shrink with the distance left.
  while (from < to) {
    const next = Math.min(to, from + Math.max(distanceToPole(work, offset, from), 1e-6 * (to - from)));
    sampleSpan(work, offset, from, next - from);
    if (withTime) addDelayAndAzimuth(work, next - from);
    else addAzimuth(work, next - from);
    if (withTime) addLogarithm(work, offset, next);
    if (motion.eta <= 0) addVortical(work, offset, from, next);
    from = next;
  }
}

/** How far a stretch from s may go: part of the Mino time in which u could reach the horizon. Leaves u in `radius`. */
function distanceToPole({ motion, series, radius }: PathWork, at: number, s: number): number {
  let u = series[at]!;
  let slope = series[at + 1]!;
  if (s > 0) {
    u = series[at + order]!;
    slope = 0;
    for (let k = order - 1; k >= 0; k--) {
      slope = slope * s + u;
      u = u * s + series[at + k]!;
    }
  }
  radius[0] = u;
  const { force, uHorizon } = motion;
  const bend = Math.abs(u * (force[0]! + u * (force[1]! + u * force[2]!)));
  const left = Math.max(uHorizon - u, 1e-15);
  return (reachOfPole * 2 * left) / (Math.abs(slope) + Math.sqrt(slope * slope + 2 * left * bend));
}

/** u, u' and μ at the eight nodes of a stretch, four at a time so that each coefficient is read twice, not eight times. */
function sampleSpan({ series, samples }: PathWork, at: number, from: number, length: number): void {
  for (let group = 0; group < 8; group += 4) {
    const s0 = from + length * nodes[group]!;
    const s1 = from + length * nodes[group + 1]!;
    const s2 = from + length * nodes[group + 2]!;
    const s3 = from + length * nodes[group + 3]!;

    let u0 = series[at + order]!;
    let u1 = u0;
    let u2 = u0;
    let u3 = u0;
    let v0 = 0;
    let v1 = 0;
    let v2 = 0;
    let v3 = 0;
    for (let k = at + order - 1; k >= at; k--) {
      const c = series[k]!;
      v0 = v0 * s0 + u0;
      v1 = v1 * s1 + u1;
      v2 = v2 * s2 + u2;
      v3 = v3 * s3 + u3;
      u0 = u0 * s0 + c;
      u1 = u1 * s1 + c;
      u2 = u2 * s2 + c;
      u3 = u3 * s3 + c;
    }
    samples[group] = u0;
    samples[group + 1] = u1;
    samples[group + 2] = u2;
    samples[group + 3] = u3;
    samples[group + 8] = v0;
    samples[group + 9] = v1;
    samples[group + 10] = v2;
    samples[group + 11] = v3;

    let m0 = series[at + terms + order]!;
    let m1 = m0;
    let m2 = m0;
    let m3 = m0;
    for (let k = at + terms + order - 1; k >= at + terms; k--) {
      const c = series[k]!;
      m0 = m0 * s0 + c;
      m1 = m1 * s1 + c;
      m2 = m2 * s2 + c;
      m3 = m3 * s3 + c;
    }
    samples[group + 16] = m0;
    samples[group + 17] = m1;
    samples[group + 18] = m2;
    samples[group + 19] = m3;
  }
}

/** Eight-point sum of the azimuth integrand: a u(2−aλu)/D + λa²μ²/(η+a²μ²). */
function addAzimuth({ motion, samples, azimuth }: PathWork, length: number): void {
  const { spin: a, lambda, polarBase, polarTwist, polarSquare } = motion;
  let sum = 0;
  for (let i = 0; i < 8; i++) {
    const u = samples[i]!;
    const x = samples[i + 16]! * samples[i + 16]!;
    const d = 1 + u * (a * a * u - 2);
    const p = polarBase + polarSquare * x;
    sum += (weights[i]! * (a * u * (2 - a * lambda * u) * p + polarTwist * x * d)) / (d * p);
  }
  azimuth[0] = azimuth[0]! + (sum * length) / motion.scale;
}

/**
 * The same with the delay, whose 1/u² and 2/u are exact derivatives plus small remainders:
 * ∫1/u² = −[u'/u] + ∫(Bu − Cu²) and ∫2/u = 2σ[ln u] + 2∫q/(1+σu'), q = (1−U)/u, σ = sign u'.
 */
function addDelayAndAzimuth({ motion, samples, azimuth, delay }: PathWork, length: number): void {
  const { spin: a, lambda, eta, polarBase, polarTwist, polarSquare } = motion;
  const b = eta + (lambda - a) * (lambda - a);
  const c = a * a * eta;
  const inwards = lambda * lambda + eta - a * a;
  const n0 = 4 + a * a - a * lambda;
  const n2 = a * a * a * (a - lambda);
  const slopeScale = samples[11]! + samples[12]! < 0 ? -motion.scale : motion.scale;

  let azimuthSum = 0;
  let delaySum = 0;
  for (let i = 0; i < 8; i++) {
    const u = samples[i]!;
    const x = samples[i + 16]! * samples[i + 16]!;
    const d = 1 + u * (a * a * u - 2);
    const p = polarBase + polarSquare * x;
    azimuthSum += (weights[i]! * (a * u * (2 - a * lambda * u) * p + polarTwist * x * d)) / (d * p);

    const polynomial = a * lambda - a * a * (1 - x) + u * (b - c * u);
    const e = 1 + slopeScale * samples[i + 8]!;
    const remainder = 2 * u * (inwards - u * (2 * b - c * u));
    delaySum += weights[i]! * (polynomial + ((n0 + u * (n2 * u - 2 * a * a)) * e + remainder * d) / (d * e));
  }
  azimuth[0] = azimuth[0]! + (azimuthSum * length) / motion.scale;
  delay[0] = delay[0]! + (delaySum * length) / motion.scale;
}

/** Takes the stretch's 2σ[ln u] into the running product whose logarithm is taken once, at an event. */
function addLogarithm({ series, samples, ratio, radius }: PathWork, at: number, to: number): void {
  let u = series[at + order]!;
  for (let k = at + order - 1; k >= at; k--) u = u * to + series[k]!;
  const outwards = samples[11]! + samples[12]! < 0;
  ratio[0] = ratio[0]! * (outwards ? radius[0]! / u : u / radius[0]!);
}
