import { handle } from "@/app/handle";
import { closeAccount } from "@/lib/people/close-account";
import { closeAccountInput } from "@/lib/people/schema";

export const DELETE = handle(closeAccountInput, closeAccount);
