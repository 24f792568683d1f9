"use client";

import type { VersionPage } from "@/lib/versions/schema";
import { Ruler } from "../ruler/ruler";

export interface FrameRulerProps {
  version: VersionPage;
  frame: number;
  onFrame: (frame: number) => void;
}

/** The frames on a ruler: its index is the frame shown, and ground without frames is hatched. */
export function FrameRuler({ version, frame, onFrame }: FrameRulerProps) {
  const { first, last, finished } = version;
  if (first === last) return null;
  return (
    <Ruler
      label="frames"
      scale={{ kind: "linear", from: first, to: last }}
      steps={chooseSteps(first, last)}
      whole
      hatched={missingRuns(first, last, finished).map((run) => ({ ...run, reason: "not rendered" }))}
      indices={[
        {
          id: "frame",
          label: "frame",
          value: frame,
          format: String,
          speak: (value) => `frame ${value}`,
          onChange: onFrame,
        },
      ]}
      valueSide="row"
    />
  );
}

/** Labels counted from the first frame, at whole frames. */
function chooseSteps(first: number, last: number) {
  const wanted = Math.max(1, (last - first) / 6);
  const unit = 10 ** Math.floor(Math.log10(wanted));
  const label =
    [1, 2, 4, 5, 8, 10].map((times) => times * unit).find((step) => step >= wanted && step % 1 === 0) ??
    10 * unit;
  return { label, fine: label % 4 === 0 && label < 16 ? label / 4 : Math.max(1, label / 10), origin: first };
}

/** The stretches between finished frames. */
export function missingRuns(first: number, last: number, finished: { first: number; last: number }[]) {
  const missing: { from: number; to: number }[] = [];
  let next = first;
  for (const run of [...finished, { first: last + 1, last: last + 1 }]) {
    if (run.first > next)
      missing.push({ from: Math.max(first, next - 0.5), to: Math.min(last, run.first - 0.5) });
    next = run.last + 1;
  }
  return missing;
}
