import type { ShotLine } from "@/lib/shots/schema";

const day = 86_400_000;
const week = 7 * day;
const mostWeeksBack = 6;
const mostWeeksAhead = 16;

const iso = (time: number) => new Date(time).toISOString().slice(0, 10);

/** The weeks the date ruler spans, counted from today so that today stands on a week's tick. */
export function chooseDates(lines: Pick<ShotLine, "dueOn">[], today: string): { from: string; to: string } {
  const now = Date.parse(today);
  const due = lines.flatMap(({ dueOn }) => (dueOn ? [Date.parse(dueOn)] : []));
  const weeks = (time: number) => Math.ceil(time / week);
  const back = Math.min(mostWeeksBack, Math.max(1, weeks(now - Math.min(now, ...due))));
  const ahead = Math.min(mostWeeksAhead, Math.max(4, weeks(Math.max(now, ...due) - now)));
  return { from: iso(now - back * week), to: iso(now + ahead * week) };
}
