import { handle } from "@/app/handle";
import { pictureSchema } from "@/lib/deliveries/schema";
import { streamPicture } from "@/lib/deliveries/stream-picture";

export const GET = handle(pictureSchema, streamPicture);
