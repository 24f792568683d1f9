import type { Ctx } from "../context";
import { listDoors } from "../deliveries/list-doors";
import { dateIn } from "../shots/today";
import { sayBytes } from "../deliveries/schema-bytes";
import type { TodayItem } from "./schema";

/** The deliveries a client has not taken yet, or has taken and not signed for. */
export async function findForClient(ctx: Ctx): Promise<TodayItem[]> {
  const doors = await listDoors(ctx);
  return doors
    .filter(({ stopped, receipt }) => !stopped && receipt === null)
    .map((door) => ({
      about: door.id,
      sentence: {
        before: "",
        name: `Delivery ${door.number}, ${door.title},`,
        after: door.taken ? " is taken, and its receipt not signed." : " is ready to be taken.",
      },
      detail: `${door.production}; ${sayBytes(door.bytes)}; open until ${dateIn(ctx.actor.timeZone, new Date(door.until))}.`,
      act: { label: door.taken ? "Sign the receipt" : "Open the delivery", href: `/deliveries/${door.id}` },
      minutes: null,
      picture: null,
      sentOn: null,
      dueOn: dateIn(ctx.actor.timeZone, new Date(door.until)),
    }));
}
