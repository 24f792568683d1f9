import { productionsWhere } from "../auth/authorize";
import type { Ctx } from "../context";
import { listEvents } from "../events/list";
import { dateIn } from "../shots/today";
import { findForAdvisor } from "./find-for-advisor";
import { findForArtist } from "./find-for-artist";
import { findForClient } from "./find-for-client";
import { findForProducer } from "./find-for-producer";
import type { Today, TodayItem } from "./schema";

const shownEvents = 12;

/** What waits for the reader in each of their roles, the most pressing first, and what happened lately. */
export async function getToday(ctx: Ctx): Promise<Today> {
  const now = new Date();
  const { timeZone } = ctx.actor;
  const seesLog = productionsWhere(ctx.actor, "log.see").length > 0;
  const [found, events] = await Promise.all([
    Promise.all([findForAdvisor(ctx), findForArtist(ctx), findForProducer(ctx, now), findForClient(ctx)]),
    seesLog ? listEvents(ctx, { limit: shownEvents }) : [],
  ]);
  const today = dateIn(timeZone, now);
  return {
    today,
    now: sayNow(now, timeZone),
    items: found.flat().sort(byUrgency),
    events: events.map(({ id, at, sentence }) => ({
      id,
      sentence,
      when: sayWhen(new Date(at), today, timeZone),
    })),
    seesLog,
  };
}

const late = "9999";
const byUrgency = (a: TodayItem, b: TodayItem) => {
  const [first, second] = [a, b].map(
    (item) => `${item.dueOn ?? late} ${item.sentOn ?? late} ${item.sentence.name}`,
  );
  return first! < second! ? -1 : 1;
};

function sayNow(now: Date, timeZone: string): string {
  const day = now.toLocaleDateString("en-GB", {
    weekday: "long",
    day: "numeric",
    month: "long",
    year: "numeric",
    timeZone,
  });
  return `${day.replace(",", "")}, ${sayTime(now, timeZone)}`;
}

const sayTime = (at: Date, timeZone: string) =>
  at.toLocaleTimeString("en-GB", { hour: "2-digit", minute: "2-digit", timeZone });

/** The time of what happened today; the day of what happened before. */
function sayWhen(at: Date, today: string, timeZone: string): string {
  return dateIn(timeZone, at) === today
    ? sayTime(at, timeZone)
    : at.toLocaleDateString("en-GB", { day: "numeric", month: "short", timeZone });
}
