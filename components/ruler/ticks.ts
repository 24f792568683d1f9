// Which ticks a ruler has room for: 13 px for labelled ones, 8 for whole steps, 4.5 for finer ones, never closer than 3 px.
import { type Placement, snapToHalf, tidy } from "./scale";

export interface Tick {
  value: number;
  at: number;
  length: 13 | 8 | 4.5;
  label?: string;
}

export interface LinearTicks {
  /** Steps between labelled, middle and fine ticks, counted from `origin`. */
  label: number;
  mid?: number;
  fine?: number;
  origin?: number;
}

export const closest = 3;
const labelGap = 8;
const labelAdvance = 6.3;

type Candidate = Omit<Tick, "at" | "label"> & { labelled?: boolean };

const isMultiple = (value: number, step: number) => Math.abs(value / step - Math.round(value / step)) < 1e-6;

/** A decade's ticks, as on a slide rule: tenths up to 2, fifths up to 5, halves up to 10; 2, 5 and 10 are labelled. */
function decadeTicks(decade: number): Candidate[] {
  const unit = 10 ** decade;
  const between = (from: number, to: number, parts: number) =>
    Array.from({ length: (to - from) * parts }, (_, index) => from + index / parts);
  const mantissas = [...between(1, 2, 10), ...between(2, 5, 5), ...between(5, 10, 2)];
  return mantissas.map((mantissa) => {
    const labelled = [1, 2, 5].some((major) => isMultiple(mantissa, major) && mantissa === major);
    const length = labelled ? 13 : isMultiple(mantissa, 1) ? 8 : 4.5;
    return { value: tidy(mantissa * unit), length, labelled } as const;
  });
}

function logCandidates(from: number, to: number): Candidate[] {
  const first = Math.floor(Math.log10(from) + 1e-9);
  const last = Math.floor(Math.log10(to) + 1e-9);
  return Array.from({ length: last - first + 1 }, (_, index) => decadeTicks(first + index)).flat();
}

function linearCandidates(from: number, to: number, steps: LinearTicks, placement: Placement): Candidate[] {
  const { label, mid, origin = 0 } = steps;
  const wanted = steps.fine ?? mid ?? label;
  const step = roomyStep(wanted, mid ?? label, placement);
  const start = Math.ceil((from - origin) / step - 1e-9);
  const end = Math.floor((to - origin) / step + 1e-9);
  return Array.from({ length: Math.max(0, end - start + 1) }, (_, index) => {
    const offset = (start + index) * step;
    const labelled = isMultiple(offset, label);
    const length = labelled ? 13 : mid !== undefined && isMultiple(offset, mid) ? 8 : 4.5;
    return { value: tidy(origin + offset), length, labelled } as const;
  });
}

/** The smallest whole multiple of `fine` that divides `coarse` and leaves room between ticks. */
function roomyStep(fine: number, coarse: number, { scale, length }: Placement): number {
  const pixels = length / Math.abs(scale.to - scale.from);
  for (let count = 1; count * fine < coarse; count++)
    if (isMultiple(coarse, count * fine) && count * fine * pixels >= closest) return count * fine;
  return coarse;
}

/** Long ticks where they are three pixels apart; between two of them the shorter ones all together, or none. */
function thin(ticks: Tick[]): Tick[] {
  const inOrder = [...ticks].sort((a, b) => a.at - b.at);
  const long: Tick[] = [];
  for (const tick of inOrder.filter(({ length }) => length === 13))
    if (tick.at - (long.at(-1)?.at ?? -Infinity) >= closest) long.push(tick);
  return weave(-Infinity, Infinity, long, inOrder, [8, 4.5]);
}

/** The posts, and between each two of them the next level's ticks if all have room, and so on down. */
function weave(low: number, high: number, posts: Tick[], ticks: Tick[], levels: number[]): Tick[] {
  const ends = [low, ...posts.map(({ at }) => at), high];
  return ends.slice(1).flatMap((end, index) => {
    const post = posts[index] ? [posts[index]] : [];
    return [...fill(ends[index]!, end, ticks, levels), ...post];
  });
}

function fill(low: number, high: number, ticks: Tick[], [level, ...finer]: number[]): Tick[] {
  if (level === undefined) return [];
  const inside = ticks.filter(({ at }) => at > low && at < high);
  const own = inside.filter(({ length }) => length === level);
  const ends = [low, ...own.map(({ at }) => at), high];
  const cramped = ends.some((at, index) => index > 0 && at - ends[index - 1]! < closest);
  return cramped ? [] : weave(low, high, own, inside, finer);
}

/** Leaves out labels that would run into the one before, or into a place that is taken. */
function thinLabels(ticks: Tick[], taken: { at: number; width: number }[]): Tick[] {
  let end = -Infinity;
  return ticks.map((tick) => {
    if (tick.label === undefined) return tick;
    const half = (tick.label.length * labelAdvance) / 2;
    const clear = taken.every((place) => Math.abs(place.at - tick.at) >= half + place.width / 2 + labelGap);
    if (tick.at - half < end + labelGap || !clear) return { ...tick, label: undefined };
    end = tick.at + half;
    return tick;
  });
}

export interface TickOptions {
  /** How a linear ruler is divided. */
  steps?: LinearTicks | undefined;
  /** The only values to label, in place of the scale's own choice. */
  labels?: readonly number[] | undefined;
  format?: ((value: number) => string) | undefined;
  /** Stretches of the label row that a value stands in. */
  taken?: { at: number; width: number }[];
}

/** Every tick of a ruler, from its start to its end, each on a half pixel. */
export function layTicks(
  placement: Placement,
  { steps, labels, format = String, taken = [] }: TickOptions = {},
): Tick[] {
  const { from, to, kind } = placement.scale;
  const [low, high] = from < to ? [from, to] : [to, from];
  const own =
    kind === "log"
      ? logCandidates(low, high)
      : linearCandidates(low, high, steps ?? chooseSteps(low, high), placement);
  const chosen = labels ? relabel(own, labels) : own;
  const inside = chosen.filter(
    ({ value }) => value >= low * (1 - 1e-12) - 1e-9 && value <= high * (1 + 1e-12) + 1e-9,
  );
  const ticks = inside.map(({ labelled, ...tick }) => ({
    ...tick,
    at: snapToHalf(placement.at(tick.value)),
    ...(labelled ? { label: format(tick.value) } : {}),
  }));
  return thinLabels(thin(ticks), taken);
}

function relabel(own: Candidate[], labels: readonly number[]): Candidate[] {
  const rest = own.filter(({ value }) => !labels.some((label) => Math.abs(label - value) < 1e-9));
  const plain = rest.map(
    (tick) => ({ value: tick.value, length: tick.length === 13 ? 8 : tick.length }) as const,
  );
  return [...plain, ...labels.map((value) => ({ value, length: 13, labelled: true }) as const)];
}

/** About five labels, at ones, twos or fives. */
export function chooseSteps(from: number, to: number): LinearTicks {
  const rough = Math.abs(to - from) / 5;
  const unit = 10 ** Math.floor(Math.log10(rough));
  const times = [1, 2, 5, 10].find((factor) => factor * unit >= rough) ?? 10;
  const label = tidy(times * unit);
  return { label, mid: label / 2, fine: label / 10 };
}
