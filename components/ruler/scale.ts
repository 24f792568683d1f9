// From values to pixels along the line and back. Laid out in numbers only; the drawing is ruler.tsx.
import { scaleLinear, scaleLog } from "d3-scale";

export interface RulerScale {
  kind: "log" | "linear";
  from: number;
  to: number;
}

export interface Placement {
  scale: RulerScale;
  length: number;
  /** Pixels along the line, not snapped. */
  at: (value: number) => number;
  valueAt: (pixel: number) => number;
}

/** Lays a scale along a line of `length` pixels. A logarithmic scale needs both ends above zero. */
export function placeScale(scale: RulerScale, length: number): Placement {
  const map = (scale.kind === "log" ? scaleLog() : scaleLinear())
    .domain([scale.from, scale.to])
    .range([0, length]);
  // Logarithms differ in their last bit between a server and a browser; a thousandth of a pixel is the same in both.
  const at = (value: number) => Math.round(map(value) * 1000) / 1000;
  return { scale, length, at, valueAt: map.invert };
}

/** The middle of the nearest pixel, where a hairline is one pixel wide and not two. */
export const snapToHalf = (pixel: number) => Math.round(pixel - 0.5) + 0.5;

/** Takes the dust of binary arithmetic off a value without touching figures anyone wrote. */
export const tidy = (value: number) => Number(value.toPrecision(12));
