import type { ReactNode } from "react";

export interface FigureProps {
  children: ReactNode;
  unit?: ReactNode;
  /** Brighter than the sentence around it. */
  bright?: boolean;
  className?: string;
}

/** A number in a sentence: mono, a little smaller than the words, never broken from its unit. */
export function Figure({ children, unit, bright, className = "" }: FigureProps) {
  return (
    <span
      className={`font-(family-name:--mono) text-[0.94em] whitespace-nowrap tabular-nums ${bright ? "text-bright" : ""} ${className}`}
    >
      {children}
      {unit !== undefined && <> {unit}</>}
    </span>
  );
}
