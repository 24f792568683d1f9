import type { z } from "zod";
import { may } from "../auth/authorize";
import type { Ctx } from "../context";
import { findDelivery } from "./find-delivery";
import { getDelivery } from "./get-delivery";
import { getDoor } from "./get-door";
import { deliveryIdSchema } from "./schema";

/** One address, two pages: the studio's for its members, the door for the client it was published to. Each verb asks for itself. */
export async function openDelivery(ctx: Ctx, input: z.infer<typeof deliveryIdSchema>) {
  const { productionId } = await findDelivery(ctx.db, input.delivery);
  return may(ctx.actor, "delivery.see", productionId)
    ? { as: "member" as const, delivery: await getDelivery(ctx, input) }
    : { as: "client" as const, door: await getDoor(ctx, input) };
}
