import { handle } from "@/app/handle";
import { openFrameFile } from "@/lib/versions/open-frame-file";
import { frameFileInput } from "@/lib/versions/schema";
import { fileResponse } from "../../../file-response";

export const GET = handle(frameFileInput, async (ctx, input, request) =>
  fileResponse(request, await openFrameFile(ctx, input)),
);
