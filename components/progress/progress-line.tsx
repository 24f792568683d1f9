import type { ReactNode } from "react";

export interface ProgressLineProps {
  /** What is being done, read aloud as the bar's name. */
  label: string;
  value: number;
  max: number;
  /** The label in full with figures, and a second, softer sentence. */
  children?: ReactNode;
  className?: string;
}

/** Work under way: a line, an index on it, and the sentence that says how far. */
export function ProgressLine({ label, value, max, children, className = "" }: ProgressLineProps) {
  const share = max > 0 ? Math.min(1, Math.max(0, value / max)) : 0;
  const percent = `${(share * 100).toFixed(2)}%`;
  return (
    <div className={`grid gap-8 ${className}`}>
      <div
        role="progressbar"
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={max}
        aria-valuenow={value}
        className="relative mt-8 h-3"
      >
        <div className="absolute inset-x-0 top-1 h-1 bg-rule" />
        <div className="absolute inset-y-0 left-0 bg-bright transition-[width]" style={{ width: percent }} />
        <div
          className="absolute -top-8 h-0 w-0 -translate-x-1/2 border-x-5 border-t-8 border-x-transparent border-t-bright transition-[left]"
          style={{ left: percent }}
        />
      </div>
      <div className="type-label text-text">{children}</div>
    </div>
  );
}
