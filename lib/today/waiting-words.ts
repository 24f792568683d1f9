import { dateIn } from "../shots/today";

const numerals = ["no", "one", "two", "three"];

/** Whole calendar days between two moments, in a zone. */
export function daysBetween(from: Date, to: Date, timeZone: string): number {
  return Math.round((Date.parse(dateIn(timeZone, to)) - Date.parse(dateIn(timeZone, from))) / 86_400_000);
}

/** "two days", "since yesterday", "since Wednesday": how long something has waited, as one would say it. */
export function sayWaiting(since: Date, now: Date, timeZone: string): string {
  const days = daysBetween(since, now, timeZone);
  const say = (options: Intl.DateTimeFormatOptions) =>
    since.toLocaleString("en-GB", { ...options, timeZone });
  if (days <= 0) return `since ${say({ hour: "2-digit", minute: "2-digit" })}`;
  if (days === 1) return "since yesterday";
  if (days <= 3) return `${numerals[days]} days`;
  if (days <= 6) return `since ${say({ weekday: "long" })}`;
  return `since ${say({ day: "numeric", month: "short" })}`;
}
