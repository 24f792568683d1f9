import { z } from "zod";
import { handle } from "@/app/handle";
import { followChanges } from "@/lib/events/follow-changes";
import { eventStream } from "./event-stream";

/** Server-sent events: every committed change the reader may know of. */
export const GET = handle(z.object({}), async (ctx, _input, request) =>
  eventStream(request.signal, (subscriber) => followChanges(ctx, subscriber)),
);
