// What the Today page shows. Plain facts: the server has worded them in the reader's own zone.

export interface TodayItem {
  /** What it is about, so that nothing is listed twice. */
  about: string;
  /** The sentence, with the name of the thing apart so that it can be set strong. */
  sentence: { before: string; name: string; after: string };
  detail: string;
  act: { label: string; href: string };
  /** How long reading it takes, where that follows from something; null where nobody can say. */
  minutes: number | null;
  picture: { versionId: string; frame: number; square: boolean } | null;
  /** Days in the reader's zone, as 2031-10-20. */
  sentOn: string | null;
  dueOn: string | null;
}

export interface Today {
  /** As 2031-10-20, and the time as "Monday 20 October 2031, 09:04", in the reader's zone. */
  today: string;
  now: string;
  items: TodayItem[];
  events: { id: number; when: string; sentence: string }[];
  seesLog: boolean;
}
