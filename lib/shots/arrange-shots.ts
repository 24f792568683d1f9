import type { ShotLine } from "./schema";
import { standings, type ShotOrder, type Standing } from "./schema-standing";

const asking = new Set<Standing>(["ready", "in review", "returned"]);
const settled = new Set<Standing>(["delivered", "received", "on hold", "omitted"]);

/** Whether someone has to do something before the shot goes on: what LOOK shows in ember. */
export const asksForWork = ({ standing }: Pick<ShotLine, "standing">): boolean => asking.has(standing);

/** Whether its day is past and it has not left the house. */
export const isLate = ({ standing, dueOn }: Pick<ShotLine, "standing" | "dueOn">, today: string): boolean =>
  dueOn !== null && dueOn < today && !settled.has(standing);

/** Puts shots in the asked order; those that are equal stay in the order of their codes. */
export function orderShots<T extends ShotLine>(lines: T[], order: ShotOrder): T[] {
  const byCode = lines.toSorted((a, b) => (a.code < b.code ? -1 : 1));
  if (order === "due date")
    return byCode.toSorted((a, b) => (a.dueOn ?? "9999").localeCompare(b.dueOn ?? "9999"));
  if (order === "standing")
    return byCode.toSorted((a, b) => standings.indexOf(a.standing) - standings.indexOf(b.standing));
  if (order === "machine time") return byCode.toSorted((a, b) => b.milliseconds - a.milliseconds);
  return byCode;
}
