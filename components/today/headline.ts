import type { TodayItem } from "@/lib/today/schema";
import { capitalised, countOf, numberWords } from "../words/number-words";

/** "Three things wait for you, about fifty minutes." The time is left out when something in it cannot be reckoned. */
export function sayHeadline(items: readonly Pick<TodayItem, "minutes">[]): string {
  if (items.length === 0) return "Nothing waits for you.";
  const things = capitalised(countOf(items.length, "thing waits", "things wait"));
  const minutes = items.reduce((sum, item) => sum + (item.minutes ?? Number.NaN), 0);
  return Number.isNaN(minutes) ? `${things} for you.` : `${things} for you, about ${sayMinutes(minutes)}.`;
}

/** "one minute", "twelve minutes", "fifty minutes", "two hours", "two and a half hours". */
export function sayMinutes(minutes: number): string {
  if (minutes <= 12) return countOf(Math.max(1, minutes), "minute", "minutes");
  if (minutes <= 57) return `${numberWords(Math.round(minutes / 5) * 5)} minutes`;
  const halves = Math.round(minutes / 30);
  const hours = Math.floor(halves / 2);
  if (halves === 2) return "an hour";
  return halves % 2 === 0 ? `${numberWords(hours)} hours` : `${numberWords(hours)} and a half hours`;
}
