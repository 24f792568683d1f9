// Where things stand about the line: `off` pixels to the side the ticks of a plain ruler hang to, below or to the left.
export interface RulerFrame {
  vertical: boolean;
  /** The line's distance from the drawing's top, or from its left edge. */
  base: number;
  /** The drawing's extent across the line. */
  breadth: number;
  /** +1 when ticks hang, -1 when they rise. */
  hang: 1 | -1;
  labelOff: number;
  valueOff: number;
}

export type Hang = "down" | "up";
export type LabelSide = "beneath" | "above";
export type ValueSide = "above" | "row" | "beneath";

export interface FrameOptions {
  vertical: boolean;
  hang: Hang;
  labelSide: LabelSide;
  valueSide: ValueSide;
  /** Whether any labelled tick is 13 px long, or only 8. */
  longTicks: boolean;
}

const valueOffs: Record<ValueSide, number> = { above: -14, row: 25, beneath: 39 };

export function layFrame({ vertical, hang, labelSide, valueSide, longTicks }: FrameOptions): RulerFrame {
  const direction = hang === "down" ? 1 : -1;
  const beneath = longTicks && hang === "down" ? 25 : 20;
  const above = hang === "up" ? -17 : -14;
  const labelOff = labelSide === "beneath" ? beneath : above;
  const valueOff = valueOffs[valueSide];
  if (vertical)
    return { vertical, base: 60, breadth: 84, hang: direction, labelOff: 17 * direction, valueOff: -14 };
  const lead = valueSide === "above" || labelSide === "above" ? 36 : 16;
  const trail = Math.max(hang === "down" ? 14 : 7, labelOff, valueOff) + 5;
  return { vertical, base: lead, breadth: lead + trail, hang: direction, labelOff, valueOff };
}

/** A point `at` along the line and `off` to its side. */
export function pointAt(frame: RulerFrame, at: number, off: number): { x: number; y: number } {
  return frame.vertical ? { x: frame.base + 0.5 - off, y: at } : { x: at, y: frame.base + 0.5 + off };
}

/** A stroke across the line at `at`, from one offset to another. */
export function strokeAcross(frame: RulerFrame, at: number, from: number, to: number) {
  const start = pointAt(frame, at, from);
  const end = pointAt(frame, at, to);
  return { x1: start.x, y1: start.y, x2: end.x, y2: end.y };
}

/** The box between two places on the line and two offsets. */
export function boxAlong(frame: RulerFrame, from: number, to: number, near: number, far: number) {
  const a = pointAt(frame, from, near);
  const b = pointAt(frame, to, far);
  return {
    x: Math.min(a.x, b.x),
    y: Math.min(a.y, b.y),
    width: Math.abs(a.x - b.x),
    height: Math.abs(a.y - b.y),
  };
}

/** The index: a triangle 10 wide and 8 high whose tip is on the line at the origin. */
export const indexPath = (vertical: boolean) => (vertical ? "M8-5L8 5L0 0Z" : "M-5-8L5-8L0 0Z");
