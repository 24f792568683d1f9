// First pass along a light path: (u, μ) step by step, and the events on the way.
import { fates, listedCrossings, type PathRecord, type TraceOptions } from "./light-path";
import { stepLimit, stride } from "./path-work";
import { slopeAt, valueAt, whereEquals, whereTurns } from "./polynomials";
import { expandSeries, order, terms } from "./series";

/** Within every published check value; a picture could do with a hundred times more. */
const defaultTolerance = 1e-12;

/** Traces (u, μ) until the path is lost, escapes, is stopped or given up. */
export function followPath(record: PathRecord, options: TraceOptions): void {
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
    const crosses = side * series[next + terms]! < 0;
    const end = endOfStep(record, at, next, h, crosses);
    if (crosses) {
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

/**
 * Notes a radial turning point, decides the fate if this step settles it, and says how far the step counts. Where the
 * horizon is only matters to a crossing in the same step.
 */
function endOfStep(record: PathRecord, at: number, next: number, h: number, crosses: boolean): number {
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
    return crosses ? whereEquals(series, at, motion.uHorizon, reach) : reach;
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
