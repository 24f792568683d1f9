import { handle } from "@/app/handle";
import { openDelivery } from "@/lib/deliveries/open-delivery";
import { deliveryIdSchema } from "@/lib/deliveries/schema";

export const GET = handle(deliveryIdSchema, openDelivery);
