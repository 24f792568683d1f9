import { handle } from "@/app/handle";
import { revokeInvitation } from "@/lib/people/revoke-invitation";
import { revokeInput } from "@/lib/people/schema";

export const DELETE = handle(revokeInput, revokeInvitation);
