import { handleOpen } from "@/app/handle";
import { clientAddress } from "@/lib/auth/client-address";
import { resetPassword } from "@/lib/people/reset-password";
import { resetPasswordInput } from "@/lib/people/schema";

export const POST = handleOpen(resetPasswordInput, ({ db }, input, request) =>
  resetPassword({ db, from: clientAddress(request.headers) }, input),
);
