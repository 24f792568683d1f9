// The standing rings of LOOK, "Glyphs": a 24-unit box, centre 12,12; angles anticlockwise from 3 o'clock.
import type { Standing } from "@/lib/shots/schema-standing";

export interface Stroke {
  d: string;
  width: number;
  dash?: string;
  round?: boolean;
}

export interface Glyph {
  strokes: Stroke[];
  point?: number;
}

export type Tone = "ember" | "ice" | "text" | "soft";

export const standingTones: Record<Standing, Tone> = {
  open: "soft",
  rendering: "text",
  stopped: "soft",
  ready: "ember",
  "in review": "ember",
  returned: "ember",
  "signed off": "ice",
  delivered: "ice",
  received: "ice",
  refused: "soft",
  "on hold": "soft",
  omitted: "soft",
};

/** The stroke w for a glyph drawn `size` pixels wide: 2 at 16, 1.6 at 24, 1.15 at 48, straight lines between. */
export function strokeUnit(size: number): number {
  if (size <= 16) return 2;
  if (size <= 24) return 2 - (0.4 * (size - 16)) / 8;
  if (size <= 48) return 1.6 - (0.45 * (size - 24)) / 24;
  return 1.15;
}

const round = (value: number) => Number(value.toFixed(3));

function pointOn(radius: number, degrees: number, centreY = 12): string {
  const angle = (degrees * Math.PI) / 180;
  return `${round(12 + radius * Math.cos(angle))} ${round(centreY - radius * Math.sin(angle))}`;
}

/** An arc drawn clockwise on screen from one angle down to another. */
export function arc(radius: number, from: number, to: number, centreY = 12): string {
  const large = from - to > 180 ? 1 : 0;
  return `M${pointOn(radius, from, centreY)}A${radius} ${radius} 0 ${large} 1 ${pointOn(radius, to, centreY)}`;
}

export function ring(radius: number): string {
  return `M${12 - radius} 12a${radius} ${radius} 0 1 1 ${2 * radius} 0a${radius} ${radius} 0 1 1 ${-2 * radius} 0z`;
}

// The gap of `returned` runs from 124° to 236°; the arc is what is left, clockwise from its upper end.
const gapped = (radius: number) => arc(radius, 124, -124);
const bar = (width: number): Stroke => ({ d: "M7 12H17", width });

const glyphs: Record<Standing, (w: number) => Glyph> = {
  open: (w) => ({ strokes: [{ d: ring(8.5), width: w }] }),
  rendering: (w) => ({
    strokes: [
      { d: arc(8.5, 90, -60), width: 2.2 * w },
      { d: arc(8.5, -60, -270), width: w, dash: "1 3.2" },
    ],
  }),
  stopped: (w) => ({ strokes: [{ d: arc(8.5, 90, -60), width: 2.2 * w }, bar(1.7 * w)] }),
  ready: (w) => ({
    strokes: [
      { d: arc(8.5, 180, 0, 16), width: 1.5 * w },
      { d: "M0.5 16H23.5", width: w },
    ],
  }),
  "in review": (w) => ({ strokes: [{ d: ring(8.5), width: w }], point: 2.6 }),
  returned: (w) => ({ strokes: [{ d: gapped(8.5), width: 1.4 * w }] }),
  "signed off": (w) => ({ strokes: [{ d: ring(8.25), width: 2 * w }], point: 3 }),
  delivered: (w) => ({ strokes: [9.25, 5.25].map((radius) => ({ d: ring(radius), width: w })) }),
  received: (w) => ({ strokes: [9.25, 5.75].map((radius) => ({ d: ring(radius), width: w })), point: 2.6 }),
  refused: (w) => ({ strokes: [9.25, 5.25].map((radius) => ({ d: gapped(radius), width: w })) }),
  "on hold": (w) => ({
    strokes: [{ d: arc(8.5, 150, 30), width: w }, { d: arc(8.5, -30, -150), width: w }, bar(1.7 * w)],
  }),
  omitted: (w) => ({ strokes: [{ d: ring(8.5), width: 1.25 * w, dash: "1.2 5.476", round: true }] }),
};

export function drawStanding(standing: Standing, size: number): Glyph {
  return glyphs[standing](strokeUnit(size));
}
