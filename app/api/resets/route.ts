import { handleOpen } from "@/app/handle";
import { clientAddress } from "@/lib/auth/client-address";
import { askForReset } from "@/lib/people/ask-for-reset";
import { askForResetInput } from "@/lib/people/schema";

export const POST = handleOpen(askForResetInput, ({ db }, input, request) =>
  askForReset({ db, from: clientAddress(request.headers) }, input),
);
