const day = { day: "numeric", month: "short", year: "numeric" } as const;
const second = { hour: "2-digit", minute: "2-digit", second: "2-digit" } as const;

/** "20 Oct 2031", in the reader's time zone. */
export const dayOf = (iso: string, timeZone: string): string =>
  new Intl.DateTimeFormat("en-GB", { ...day, timeZone }).format(new Date(iso));

/** "20 Oct 2031, 09:04:11", in the reader's time zone. */
export const momentOf = (iso: string, timeZone: string): string =>
  new Intl.DateTimeFormat("en-GB", { ...day, ...second, timeZone }).format(new Date(iso));
