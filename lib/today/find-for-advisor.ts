import type { Ctx } from "../context";
import { listQueue } from "../reviews/list-queue";
import type { TodayItem } from "./schema";

/** The versions that wait for this advisor's verdict. */
export async function findForAdvisor(ctx: Ctx): Promise<TodayItem[]> {
  const { items } = await listQueue(ctx);
  return items
    .filter(({ yours, hold }) => yours && hold === "none")
    .map((item) => {
      const frames = item.last - item.first + 1;
      const withdrawn = item.withdrawn > 0 ? "Its sign-off was withdrawn. " : "";
      return {
        about: item.shotId,
        sentence: {
          before: `Version ${item.number} of `,
          name: item.shotCode,
          after: ` has waited ${item.waited} for your verdict.`,
        },
        detail: `${withdrawn}${item.maker}: “${item.words}” ${frames} ${frames === 1 ? "frame" : "frames"}; ${item.minutes} minutes.`,
        act: { label: `Open version ${item.number}`, href: `/versions/${item.id}` },
        minutes: item.minutes,
        picture: {
          versionId: item.id,
          frame: Math.floor((item.first + item.last) / 2),
          square: item.kind === "dome",
        },
        sentOn: item.sentOn,
        dueOn: item.dueOn,
      };
    });
}
