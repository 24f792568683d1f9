import { handleOpen } from "@/app/handle";
import { clientAddress } from "@/lib/auth/client-address";
import { currentActor } from "@/lib/auth/session";
import { joinAsKnown, joinAsNew } from "@/lib/people/accept-invitation";
import { joinAsKnownInput, joinAsNewInput } from "@/lib/people/schema";

/** Someone new makes their account. The token travels in the body, so that no log of addresses holds it. */
export const POST = handleOpen(joinAsNewInput, ({ db }, input, request) =>
  joinAsNew({ db, from: clientAddress(request.headers) }, input),
);

/** Someone who has an account joins one more production. */
export const PUT = handleOpen(joinAsKnownInput, async ({ db }, input, request) =>
  joinAsKnown({ db, from: clientAddress(request.headers), signedIn: await currentActor() }, input),
);
