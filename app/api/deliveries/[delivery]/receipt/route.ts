import { handle } from "@/app/handle";
import { signReceiptSchema } from "@/lib/deliveries/schema";
import { signReceipt } from "@/lib/deliveries/sign-receipt";

export const POST = handle(signReceiptSchema, signReceipt);
