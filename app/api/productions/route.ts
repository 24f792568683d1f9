import { handle } from "@/app/handle";
import { createProduction } from "@/lib/productions/create";
import { createProductionInput } from "@/lib/productions/schema";

export const POST = handle(createProductionInput, createProduction);
