import { handle } from "@/app/handle";
import { removePerson } from "@/lib/people/remove";
import { removePersonInput } from "@/lib/people/schema";

export const DELETE = handle(removePersonInput, removePerson);
