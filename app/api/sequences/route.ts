import { handle } from "@/app/handle";
import { createSequence } from "@/lib/shots/create-sequence";
import { createSequenceInput } from "@/lib/shots/schema";

export const POST = handle(createSequenceInput, createSequence);
