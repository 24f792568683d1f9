// Where an index may go: its ends, its forbidden ground, its snap marks, and how far one tick is.
import { type RulerScale, tidy } from "./scale";

export interface IndexRule {
  min: number;
  max: number;
  /** Open intervals no index may stand in. */
  forbidden: { from: number; to: number }[];
  snaps: number[];
  /** One tick at a value, in a direction. */
  tick: (value: number, direction: 1 | -1) => number;
  /** Only whole values, as frames are. */
  whole: boolean;
}

const tenth = (value: number) => value / 10;

/** One tick of a logarithmic ruler: a tenth of the decade's unit up to 2, a fifth up to 5, a half up to 10. */
export function logTick(value: number, direction: 1 | -1): number {
  const nudged = value * (1 + direction * 1e-9);
  const unit = 10 ** Math.floor(Math.log10(nudged));
  const mantissa = nudged / unit;
  return unit * (mantissa < 2 ? 0.1 : mantissa < 5 ? 0.2 : 0.5);
}

/** The rule's ends once forbidden ground that reaches them is taken off. */
export function freeEnds(rule: IndexRule): { min: number; max: number } {
  let { min, max } = rule;
  for (const { from, to } of rule.forbidden) {
    if (from <= rule.min) min = Math.max(min, to);
    if (to >= rule.max) max = Math.min(max, from);
  }
  return { min, max };
}

/** The nearest place to `value` where an index may stand. */
export function constrain(value: number, rule: IndexRule): number {
  const { min, max } = freeEnds(rule);
  const rounded = rule.whole ? Math.round(value) : value;
  let place = Math.min(max, Math.max(min, rounded));
  for (const { from, to } of rule.forbidden) {
    if (place <= from || place >= to || from <= min || to >= max) continue;
    place = place - from < to - place ? from : to;
  }
  return tidy(place);
}

/** A dragged value, rounded to what the ruler can be read to: a tenth of a tick. */
export function roundToGrain(value: number, rule: IndexRule): number {
  const grain = rule.whole ? 1 : tenth(rule.tick(value, 1));
  return tidy(Math.round(value / grain) * grain);
}

/** One tick from a value, ten of them, or a tenth of one. */
export function step(
  value: number,
  direction: 1 | -1,
  size: "tick" | "ten" | "tenth",
  rule: IndexRule,
): number {
  if (size === "ten") {
    let moved = value;
    for (let count = 0; count < 10; count++) moved = tidy(moved + direction * rule.tick(moved, direction));
    return constrain(moved, rule);
  }
  const tick = rule.tick(value, direction);
  const stride = rule.whole ? Math.max(1, Math.round(tick)) : size === "tenth" ? tenth(tick) : tick;
  return constrain(tidy(value + direction * stride), rule);
}

/** The next snap mark that way, or the ruler's end. */
export function nextSnap(value: number, direction: 1 | -1, rule: IndexRule): number {
  const ahead = rule.snaps
    .filter((snap) => (snap - value) * direction > 1e-9 && constrain(snap, rule) === tidy(snap))
    .sort((a, b) => (a - b) * direction);
  const { min, max } = freeEnds(rule);
  return ahead[0] ?? (direction === 1 ? max : min);
}

/** The rule of a scale without further limits. */
export function plainRule(scale: RulerScale, linearTick: number): IndexRule {
  const [min, max] = scale.from < scale.to ? [scale.from, scale.to] : [scale.to, scale.from];
  const tick = scale.kind === "log" ? logTick : () => linearTick;
  return { min, max, forbidden: [], snaps: [], tick, whole: false };
}
