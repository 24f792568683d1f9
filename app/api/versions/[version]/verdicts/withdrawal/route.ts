import { handle } from "@/app/handle";
import { withdrawVerdictSchema } from "@/lib/reviews/schema";
import { withdrawVerdict } from "@/lib/reviews/withdraw-verdict";

export const POST = handle(withdrawVerdictSchema, withdrawVerdict);
