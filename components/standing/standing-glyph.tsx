import type { Standing } from "@/lib/shots/schema-standing";
import { drawStanding, standingTones, type Tone } from "./geometry";

export const toneText: Record<Tone, string> = {
  ember: "text-ember",
  ice: "text-ice",
  text: "text-text",
  soft: "text-soft",
};

export interface StandingGlyphProps {
  standing: Standing;
  /** Pixels; the strokes suit 16, 24 and 48. */
  size?: number;
  className?: string;
}

/** The ring alone. It is never shown without its word, so it is silent to screen readers. */
export function StandingGlyph({ standing, size = 16, className = "" }: StandingGlyphProps) {
  const { strokes, point } = drawStanding(standing, size);
  const turns = standing === "rendering" ? "origin-center animate-turn" : "";
  return (
    <svg
      viewBox="0 0 24 24"
      width={size}
      height={size}
      fill="none"
      stroke="currentColor"
      aria-hidden="true"
      data-standing={standing}
      className={`inline-block shrink-0 ${toneText[standingTones[standing]]} ${turns} ${className}`}
    >
      {strokes.map(({ d, width, dash, round }) => (
        <path
          key={d}
          d={d}
          strokeWidth={width}
          strokeDasharray={dash}
          strokeLinecap={round ? "round" : "butt"}
        />
      ))}
      {point && <circle cx={12} cy={12} r={point} fill="currentColor" stroke="none" />}
    </svg>
  );
}
