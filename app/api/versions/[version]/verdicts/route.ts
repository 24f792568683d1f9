import { handle } from "@/app/handle";
import { getDeclaration } from "@/lib/reviews/get-declaration";
import { giveVerdict } from "@/lib/reviews/give-verdict";
import { giveVerdictSchema, versionIdSchema } from "@/lib/reviews/schema";

export const GET = handle(versionIdSchema, getDeclaration);
export const POST = handle(giveVerdictSchema, giveVerdict);
