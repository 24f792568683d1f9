import { handle } from "@/app/handle";
import { makeDelivery } from "@/lib/deliveries/make-delivery";
import { makeDeliverySchema } from "@/lib/deliveries/schema";

export const POST = handle(makeDeliverySchema, makeDelivery);
