import type { Ctx } from "../context";
import { listQueue } from "../reviews/list-queue";
import { dateIn } from "../shots/today";
import { minutesForVersion } from "./reading-time";
import type { TodayItem } from "./schema";
import { sayWaiting } from "./waiting-words";

/** The versions that wait for this advisor's verdict. */
export async function findForAdvisor(ctx: Ctx, now: Date): Promise<TodayItem[]> {
  const { items } = await listQueue(ctx);
  const { timeZone } = ctx.actor;
  return items
    .filter(({ yours, hold }) => yours && hold === "none")
    .map((item) => {
      const frames = item.last - item.first + 1;
      const minutes = minutesForVersion(frames);
      const withdrawn = item.withdrawn > 0 ? "its sign-off was withdrawn; " : "";
      return {
        about: item.shotId,
        sentence: {
          before: `Version ${item.number} of `,
          name: item.shotCode,
          after: ` has waited ${sayWaiting(new Date(item.sentAt), now, timeZone)} for your verdict.`,
        },
        detail: `${withdrawn}${item.maker}: “${item.words}” ${frames} ${frames === 1 ? "frame" : "frames"}; ${minutes} minutes.`,
        act: { label: `Open version ${item.number}`, href: `/versions/${item.id}` },
        minutes,
        picture: { versionId: item.id, frame: middleOf(item), square: item.kind === "dome" },
        sentOn: dateIn(timeZone, new Date(item.sentAt)),
        dueOn: item.dueOn,
      };
    });
}

const middleOf = ({ first, last }: { first: number; last: number }) => Math.floor((first + last) / 2);
