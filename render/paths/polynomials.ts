// Evaluating a step's series and finding where it takes a value. Events are found on the series itself,
// never by interpolating between steps.
import { order } from "./series";

// Newton's error is squared by each round, so a move this small leaves one below rounding.
const quadratic = 1e-8;

/** The series at s. */
export function valueAt(series: Float64Array, offset: number, s: number): number {
  let value = series[offset + order]!;
  for (let k = order - 1; k >= 0; k--) value = value * s + series[offset + k]!;
  return value;
}

/** The series' derivative at s. */
export function slopeAt(series: Float64Array, offset: number, s: number): number {
  let slope = order * series[offset + order]!;
  for (let k = order - 1; k >= 1; k--) slope = slope * s + k * series[offset + k]!;
  return slope;
}

/** The series' second derivative at s. */
function curvatureAt(series: Float64Array, offset: number, s: number): number {
  let curvature = order * (order - 1) * series[offset + order]!;
  for (let k = order - 1; k >= 2; k--) curvature = curvature * s + k * (k - 1) * series[offset + k]!;
  return curvature;
}

/**
 * The s in [0, length] where the series equals `target`, which lies between its end values. Newton's method kept
 * inside a shrinking bracket, so it always ends.
 */
export function whereEquals(series: Float64Array, offset: number, target: number, length: number): number {
  let low = 0;
  let high = length;
  const first = series[offset]! - target;
  const last = valueAt(series, offset, length) - target;
  if (first === 0) return 0;
  let s = (length * first) / (first - last);
  for (let round = 0; round < 60; round++) {
    let excess = series[offset + order]!;
    let slope = 0;
    for (let k = order - 1; k >= 0; k--) {
      slope = slope * s + excess;
      excess = excess * s + series[offset + k]!;
    }
    excess -= target;
    if (excess > 0 === first > 0) low = s;
    else high = s;
    const next = s - excess / slope;
    const moved = next >= low && next <= high ? next : 0.5 * (low + high);
    if (Math.abs(moved - s) <= quadratic * length) return moved;
    s = moved;
  }
  return s;
}

/** The s in [0, length] where the series turns: its slope has opposite signs at the ends. */
export function whereTurns(series: Float64Array, offset: number, length: number): number {
  let low = 0;
  let high = length;
  const first = series[offset + 1]!;
  const last = slopeAt(series, offset, length);
  let s = (length * first) / (first - last);
  for (let round = 0; round < 60; round++) {
    const slope = slopeAt(series, offset, s);
    if (slope > 0 === first > 0) low = s;
    else high = s;
    const next = s - slope / curvatureAt(series, offset, s);
    const moved = next >= low && next <= high ? next : 0.5 * (low + high);
    if (Math.abs(moved - s) <= quadratic * length) return moved;
    s = moved;
  }
  return s;
}
