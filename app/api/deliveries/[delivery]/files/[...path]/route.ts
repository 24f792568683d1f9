import { handle } from "@/app/handle";
import { takeFileSchema } from "@/lib/deliveries/schema";
import { streamFile } from "@/lib/deliveries/stream-file";

export const GET = handle(takeFileSchema, streamFile);
