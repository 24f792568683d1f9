// A row's share of the date ruler: places in percent, so that a lane needs no script and no measuring.
import { dayOf, sayDay, sayDays, sayLate } from "./dates";

export interface LaneFacts {
  from: string;
  to: string;
  today: string;
  due?: string | null | undefined;
  /** The due date was kept: the index stands open. */
  met?: boolean | undefined;
  /** Since when it waits. */
  sent?: string | null | undefined;
  forecast?: { from: string; to: string; what: string } | null | undefined;
  /** Before the due date's words: "due 24 Oct" on Today, "24 Oct" on Shots. */
  duePrefix?: string | undefined;
}

export interface Lane {
  today: number | null;
  due: { at: number; words: string; look: "met" | "late" | "ahead" } | null;
  waiting: { at: number; words: string } | null;
  forecast: { from: number; to: number; words: string } | null;
  sentence: string;
}

export function layLane(facts: LaneFacts): Lane {
  const [first, last, today] = [dayOf(facts.from), dayOf(facts.to), dayOf(facts.today)];
  const percent = (day: number) =>
    Number(((Math.min(last, Math.max(first, day)) - first) / (last - first)) * 100);
  const place = (day: number) => Number(percent(day).toFixed(3));
  const due = facts.due ? layDue(facts, dayOf(facts.due), today, place) : null;
  const waiting = facts.sent
    ? { at: place(dayOf(facts.sent)), words: `sent ${sayDay(dayOf(facts.sent))}` }
    : null;
  const forecast = facts.forecast ? layForecast(facts.forecast, place) : null;
  const said = [due?.words, waiting?.words, forecast?.words].filter(Boolean);
  return {
    today: today >= first && today <= last ? place(today) : null,
    due,
    waiting,
    forecast,
    sentence: said.length > 0 ? said.join("; ") : "no date",
  };
}

function layDue(
  { met, duePrefix }: LaneFacts,
  due: number,
  today: number,
  place: (day: number) => number,
): Lane["due"] {
  const at = place(due);
  const day = sayDay(due);
  if (met) return { at, words: `${day}, met`, look: "met" };
  const days = Math.floor(today) - Math.floor(due);
  if (days > 0) return { at, words: `${sayLate(days)}, due ${day}`, look: "late" };
  return { at, words: duePrefix ? `${duePrefix} ${day}` : day, look: "ahead" };
}

function layForecast(
  forecast: NonNullable<LaneFacts["forecast"]>,
  place: (day: number) => number,
): Lane["forecast"] {
  const [from, to] = [dayOf(forecast.from), dayOf(forecast.to)];
  return { from: place(from), to: place(to), words: `${forecast.what}, ${sayDays(from, to)}` };
}
