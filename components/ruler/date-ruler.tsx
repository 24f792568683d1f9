"use client";

import { dayOf, sayDay, weekSteps } from "./dates";
import { Ruler } from "./ruler";

export interface DateRulerProps {
  /** The first and last day, as "2031-10-13". Weeks are counted from the first. */
  from: string;
  to: string;
  today: string;
  /** The word above today's index; its date when absent. */
  todayWord?: string;
  length?: number;
  className?: string;
}

/** The dates at the head of a column of lanes: weeks labelled above, days hanging below, an index at today. */
export function DateRuler({ from, to, today, todayWord, ...rest }: DateRulerProps) {
  const [first, last, now] = [dayOf(from), dayOf(to), dayOf(today)];
  const index = {
    id: "today",
    label: "today",
    value: now,
    format: (day: number) => todayWord ?? sayDay(day),
  };
  const within = now >= first && now <= last;
  return (
    <Ruler
      {...rest}
      label={`dates from ${sayDay(first)} to ${sayDay(last)}`}
      scale={{ kind: "linear", from: first, to: last }}
      steps={(length) => ({ ...weekSteps(last - first, length), origin: first })}
      formatLabel={sayDay}
      labelSide="above"
      indices={within ? [index] : []}
    />
  );
}
