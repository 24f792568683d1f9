// Numbers as a reader would say them.
import type { ShotList } from "@/lib/shots/schema";
import { capitalised, countOf } from "../words/number-words";

/** "Eleven shots; three ask for work, one is late." */
export function sayShots({ shots, asking, late }: ShotList["totals"]): string {
  if (shots === 0) return "No shots yet.";
  const ask = asking === 0 ? "none asks for work" : countOf(asking, "asks for work", "ask for work");
  const lateness = late === 0 ? "" : `, ${countOf(late, "is late", "are late")}`;
  return `${capitalised(countOf(shots, "shot", "shots"))}; ${ask}${lateness}.`;
}

/** A length of time to two or three figures: "12 s", "3.4 min", "50.9 h". */
export function sayDuration(milliseconds: number): string {
  const seconds = milliseconds / 1000;
  if (seconds < 59.5) return `${seconds < 9.95 && seconds > 0 ? seconds.toFixed(1) : Math.round(seconds)} s`;
  if (seconds < 3570) return `${(seconds / 60).toFixed(seconds < 594 ? 1 : 0)} min`;
  return `${(seconds / 3600).toFixed(1)} h`;
}
