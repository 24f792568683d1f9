import { handle } from "@/app/handle";
import { measureDelivery } from "@/lib/deliveries/measure-delivery";
import { measureDeliverySchema } from "@/lib/deliveries/schema";

// A question with a body as long as the answer to it may be: asked by POST, and nothing is written.
export const POST = handle(measureDeliverySchema, measureDelivery);
