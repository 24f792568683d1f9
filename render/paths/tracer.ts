// The readable reference tracer: one light path, from an observer into the past, by Taylor series in Mino time.
// Variables u = 1/r and μ = cos θ have neither square roots nor sign changes at turning points (PHYSICS §3).
import { addSpan, clearSums } from "./delays";
import { clearPathRecord, fates, listedCrossings, type PathRecord, type PathStart } from "./light-path";
import { polarPotential, radialPotential, setMotion } from "./motion";
import { azimuthOfOrbit } from "./polar-azimuth";
import { stepLimit, stride, type PathWork } from "./path-work";
import { slopeAt, valueAt, whereEquals, whereTurns } from "./polynomials";
import { expandSeries, order, terms } from "./series";

export interface TraceOptions {
  /** Bound on a step's last kept terms, relative to the coordinate's own scale. */
  tolerance?: number;
  /** False leaves dt at zero and costs less. */
  withTime?: boolean;
  /** Stop, with fate `stopped`, at the crossing of this number. */
  stopAfterCrossings?: number;
  /** Stop, with fate `stopped`, at the first crossing whose radius is within [stopInner, stopOuter]: an opaque disk. */
  stopInner?: number;
  stopOuter?: number;
}

const defaults: TraceOptions = {};
export const defaultTolerance = 1e-11;

/** Traces one path and fills `record`. Never throws: what cannot be traced ends `unresolved`. Allocates nothing. */
export function traceInto(start: PathStart, record: PathRecord, options: TraceOptions = defaults): void {
  clearPathRecord(record);
  const { work } = record;
  if (!setMotion(start, work)) return;
  followPath(record, options);
  if (record.fate === fates.escaped || record.crossingCount > 0)
    addAzimuthAndTime(record, options.withTime ?? true);
  record.residual = invariantDrift(work, record.steps - 1);
}

/** First pass: (u, μ) step by step until the path is lost, escapes, is stopped or given up. */
function followPath(record: PathRecord, options: TraceOptions): void {
  const { work } = record;
  const { motion, series, length } = work;
  const tolerance = options.tolerance ?? defaultTolerance;
  const uScale = 1 / motion.scale;
  let side = series[terms]! !== 0 ? series[terms]! : series[terms + 1]!;

  for (let step = 0; step < stepLimit; step++) {
    const at = step * stride;
    const next = at + stride;
    expandSeries(motion.force, 0, series, at);
    expandSeries(motion.force, 3, series, at + terms);
    const h = stepLength(series, at, uScale, tolerance);
    advance(series, at, next, h);
    length[step] = h;
    record.steps = step + 1;
    if (!(Math.abs(series[next]!) < 1e9 && Math.abs(series[next + terms]!) < 1e9)) return;

    // Where this step ends: at the horizon, on the celestial sphere, or after its whole length.
    const end = endOfStep(record, at, next, h);
    if (side * series[next + terms]! < 0) {
      side = -side;
      const crossing = whereEquals(series, at + terms, 0, h);
      if (crossing < end && noteCrossing(record, step, crossing, options)) return;
    }
    if (record.fate !== fates.unresolved) {
      length[step] = end;
      return;
    }
  }
}

/** The longest step, at most 1, whose last two terms are within tolerance: h¹⁶ = tolerance/terms, no pow needed. */
function stepLength(series: Float64Array, at: number, uScale: number, tolerance: number): number {
  const u = Math.abs(series[at + order - 1]!) + Math.abs(series[at + order]!);
  const mu = Math.abs(series[at + terms + order - 1]!) + Math.abs(series[at + terms + order]!);
  const worst = Math.max(u / Math.max(series[at]!, uScale), mu);
  if (worst <= tolerance) return 1;
  return Math.sqrt(Math.sqrt(Math.sqrt(Math.sqrt(tolerance / worst))));
}

/** Values and slopes of both series at h become the next step's first two terms. */
function advance(series: Float64Array, at: number, next: number, h: number): void {
  let u = series[at + order]!;
  let uSlope = 0;
  let mu = series[at + terms + order]!;
  let muSlope = 0;
  for (let k = order - 1; k >= 0; k--) {
    uSlope = uSlope * h + u;
    u = u * h + series[at + k]!;
    muSlope = muSlope * h + mu;
    mu = mu * h + series[at + terms + k]!;
  }
  series[next] = u;
  series[next + 1] = uSlope;
  series[next + terms] = mu;
  series[next + terms + 1] = muSlope;
}

/** Notes a radial turning point, decides the fate if this step settles it, and says how far the step counts. */
function endOfStep(record: PathRecord, at: number, next: number, h: number): number {
  const { motion, series } = record.work;
  const u1 = series[next]!;
  let reach = h;
  let uReach = u1;
  if (series[at + 1]! * series[next + 1]! < 0) {
    const turn = whereTurns(series, at, h);
    const uTurn = valueAt(series, at, turn);
    const outside = uTurn > 0 && uTurn < motion.uHorizon;
    if (outside && record.rTurningPoint === 0) record.rTurningPoint = 1 / uTurn;
    if (!outside) {
      reach = turn;
      uReach = uTurn;
    }
  }
  if (uReach >= motion.uHorizon) {
    record.fate = fates.captured;
    return whereEquals(series, at, motion.uHorizon, reach);
  }
  if (uReach <= 0) {
    record.fate = fates.escaped;
    return whereEquals(series, at, 0, reach);
  }
  return h;
}

/** Counts a crossing of the equatorial plane, lists it if there is room, and says whether the caller stops here. */
function noteCrossing(record: PathRecord, step: number, s: number, options: TraceOptions): boolean {
  const { series, crossingStep, crossingAt, length } = record.work;
  const at = step * stride;
  const r = 1 / valueAt(series, at, s);
  const index = record.crossingsTotal++;
  if (index < listedCrossings) {
    record.r[index] = r;
    record.signPr[index] = slopeAt(series, at, s) < 0 ? -1 : 1;
    record.signPtheta[index] = series[at + terms]! > 0 || series[at + terms + 1]! < 0 ? -1 : 1;
    crossingStep[index] = step;
    crossingAt[index] = s;
    record.crossingCount = index + 1;
  }
  const stopped =
    index + 1 === options.stopAfterCrossings ||
    (r >= (options.stopInner ?? Infinity) && r <= (options.stopOuter ?? Infinity));
  if (!stopped) return false;
  record.fate = fates.stopped;
  length[step] = s;
  return true;
}

/** Second pass: φ and t, only as far as a listed crossing or an escape needs them. */
function addAzimuthAndTime(record: PathRecord, withTime: boolean): void {
  const { work } = record;
  const { motion, series, span } = work;
  const { lambda, eta, scale, energySign } = motion;
  const turnSign = lambda < 0 ? -1 : 1;
  const onAxis = Math.abs(series[terms]!) === 1;
  const begun = onAxis ? Math.PI : azimuthOfOrbit(lambda, series[terms]!, scale * series[terms + 1]!);
  const lastStep =
    record.fate === fates.escaped ? record.steps - 1 : work.crossingStep[record.crossingCount - 1]!;
  clearSums(work);

  let crossing = 0;
  for (let step = 0; step <= lastStep; step++) {
    const at = step * stride;
    span[0] = 0;
    if (crossing < record.crossingCount && work.crossingStep[crossing] === step) {
      const s = work.crossingAt[crossing]!;
      span[1] = s;
      addSpan(work, at, withTime);
      const turned = eta > 0 ? Math.PI * (crossing + 1) - begun : 0;
      record.dphi[crossing] = -energySign * (work.azimuth[0]! + turnSign * turned);
      record.dt[crossing] = withTime ? energySign * delayAt(work, at, s) : 0;
      record.axisBefore[crossing] = lambda === 0 ? Math.round(turned / Math.PI) : 0;
      crossing++;
      span[0] = s;
    }
    if (step === lastStep && record.fate !== fates.escaped) return;
    span[1] = work.length[step]!;
    addSpan(work, at, withTime && crossing < record.crossingCount);
  }

  const at = lastStep * stride + terms;
  const end = work.length[lastStep]!;
  const mu = Math.min(1, Math.max(-1, valueAt(series, at, end)));
  const since = azimuthOfOrbit(lambda, mu, scale * slopeAt(series, at, end));
  const turned = eta > 0 ? Math.PI * record.crossingsTotal + since - begun : 0;
  record.cosThetaInf = mu;
  record.dphiInf = -energySign * (work.azimuth[0]! + turnSign * turned);
  record.axisPassages = lambda === 0 ? Math.round(turned / Math.PI) : 0;
}

/** The delay at an event: the running integral, and what its closed forms give between the observer and here. */
function delayAt({ motion, series, delay, ratio }: PathWork, at: number, s: number): number {
  const here = slopeAt(series, at, s) / valueAt(series, at, s);
  const there = series[1]! / series[0]!;
  return delay[0]! + 2 * Math.log(ratio[0]!) + motion.scale * (there - here);
}

/** How far the last step's start has drifted from u'² = U and μ'² = M, each on its own scale. */
function invariantDrift(work: PathWork, step: number): number {
  const { motion, series } = work;
  const at = step * stride;
  const uSlope = motion.scale * series[at + 1]!;
  const muSlope = series[at + terms + 1]!;
  const radial = uSlope * uSlope - radialPotential(motion.spin, motion.lambda, motion.eta, series[at]!);
  const polar = polarPotential(motion.spin, motion.lambda, motion.eta, series[at + terms]!);
  return Math.max(Math.abs(radial), Math.abs(muSlope * muSlope - polar / (motion.scale * motion.scale)));
}
