import { handle } from "@/app/handle";
import { takeZipSchema } from "@/lib/deliveries/schema";
import { streamZip } from "@/lib/deliveries/stream-zip";

export const GET = handle(takeZipSchema, streamZip);
