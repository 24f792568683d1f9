import { handle } from "@/app/handle";
import { publishDelivery } from "@/lib/deliveries/publish-delivery";
import { publishDeliverySchema } from "@/lib/deliveries/schema";

export const POST = handle(publishDeliverySchema, publishDelivery);
