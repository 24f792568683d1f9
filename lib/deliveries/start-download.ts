import { downloads } from "@/db/schema/deliveries";
import type { Ctx } from "../context";
import { findDoor, refuseShut } from "./find-door";

/** Writes down that a client begins to take something; refused unless their door is open. */
export async function startDownload(ctx: Ctx, input: { delivery: string; what: string }): Promise<string> {
  refuseShut(await findDoor(ctx, "door.take", input.delivery));
  const [row] = await ctx.db
    .insert(downloads)
    .values({ deliveryId: input.delivery, personId: ctx.actor.id, what: input.what })
    .returning({ id: downloads.id });
  return row!.id;
}
