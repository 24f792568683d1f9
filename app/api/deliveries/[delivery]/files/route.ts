import { handle } from "@/app/handle";
import { listDoorFiles } from "@/lib/deliveries/list-door-files";
import { takeZipSchema } from "@/lib/deliveries/schema";

export const GET = handle(takeZipSchema, listDoorFiles);
