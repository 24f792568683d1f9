import { handle } from "@/app/handle";
import { withdrawDeliverySchema } from "@/lib/deliveries/schema";
import { withdrawDelivery } from "@/lib/deliveries/withdraw-delivery";

export const POST = handle(withdrawDeliverySchema, withdrawDelivery);
