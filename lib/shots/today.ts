/** The date it is now in a time zone, as 2031-10-20. */
export function dateIn(timeZone: string, at = new Date()): string {
  return at.toLocaleDateString("en-CA", { timeZone, year: "numeric", month: "2-digit", day: "2-digit" });
}
