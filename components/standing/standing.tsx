import type { Standing as StandingName } from "@/lib/shots/schema-standing";
import { standingTones } from "./geometry";
import { StandingGlyph, toneText } from "./standing-glyph";

export interface StandingProps {
  standing: StandingName;
  size?: number;
  className?: string;
}

/** A standing as it is always shown: its ring and its word, in its tone. */
export function Standing({ standing, size = 16, className = "" }: StandingProps) {
  return (
    <span
      className={`inline-flex items-center gap-8 whitespace-nowrap ${toneText[standingTones[standing]]} ${className}`}
    >
      <StandingGlyph standing={standing} size={size} />
      {standing}
    </span>
  );
}
