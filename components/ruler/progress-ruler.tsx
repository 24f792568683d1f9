"use client";

import { Ruler } from "./ruler";

export interface ProgressRulerProps {
  /** What is counted: "gigabytes checked". */
  label: string;
  value: number;
  max: number;
  /** The value in words for the ear: "49.6 of 72.4 gigabytes". */
  spoken: string;
  /** Ice for what settles as it is counted; text for work under way. */
  tone?: "ice" | "text";
  length?: number;
  className?: string;
}

/** Progress on a ruler: a band from nothing to the index, in the unit that is counted. */
export function ProgressRuler({
  label,
  value,
  max,
  spoken,
  tone = "ice",
  length,
  className = "",
}: ProgressRulerProps) {
  const end = Math.max(max, Number.MIN_VALUE);
  const place = Math.min(end, Math.max(0, value));
  return (
    <div
      role="progressbar"
      aria-label={label}
      aria-valuemin={0}
      aria-valuemax={max}
      aria-valuenow={place}
      aria-valuetext={spoken}
      className={className}
    >
      <Ruler
        silent
        label={label}
        scale={{ kind: "linear", from: 0, to: end }}
        {...(length === undefined ? {} : { length })}
        bands={place > 0 ? [{ from: 0, to: place, fill: `var(--${tone})` }] : []}
        indices={[{ id: "progress", label, value: place, format: String, hideValue: true }]}
      />
    </div>
  );
}
