// Dates as days, and days as words. The day's number is counted in UTC, as due dates are whole days.
import { countOf } from "../words/number-words";

const dayLength = 86_400_000;
const months = ["Jan", "Feb", "Mar", "Apr", "May", "Jun", "Jul", "Aug", "Sep", "Oct", "Nov", "Dec"];

/** Days since 1970-01-01 of "2031-10-20" or of a time in ISO 8601. */
export const dayOf = (date: string) => Date.parse(date) / dayLength;

/** "20 Oct" of a day's number. */
export function sayDay(day: number): string {
  const date = new Date(Math.floor(day) * dayLength);
  return `${date.getUTCDate()} ${months[date.getUTCMonth()]}`;
}

/** "21–22 Oct", "30 Oct–2 Nov", or one day. */
export function sayDays(from: number, to: number): string {
  const [first, last] = [sayDay(from), sayDay(to)];
  if (first === last) return first;
  const [day, month] = first.split(" ");
  return month === last.split(" ")[1] ? `${day}–${last}` : `${first}–${last}`;
}

/** "three days late". */
export function sayLate(days: number): string {
  return `${countOf(days, "day", "days")} late`;
}

/** Weeks between labels: as many as their words need. */
export function weekSteps(days: number, length: number) {
  const weeks = [1, 2, 4, 8, 13, 26, 52].find((count) => (count * 7 * length) / days >= 52) ?? 52;
  return { label: weeks * 7, mid: weeks > 1 ? 7 : undefined, fine: 1 };
}
