import { handle } from "@/app/handle";
import { invitePerson } from "@/lib/people/invite";
import { inviteInput } from "@/lib/people/schema";

export const POST = handle(inviteInput, invitePerson);
