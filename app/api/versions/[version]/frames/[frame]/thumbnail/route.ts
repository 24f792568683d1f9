import { handle } from "@/app/handle";
import { drawThumbnail } from "@/lib/versions/draw-thumbnail";
import { thumbnailInput } from "@/lib/versions/schema";
import { immutable, isFresh, notModified } from "../../../file-response";

export const GET = handle(thumbnailInput, async (ctx, input, request) => {
  const { picture, etag } = await drawThumbnail(ctx, input);
  if (isFresh(request, etag)) return notModified(etag);
  return new Response(new Uint8Array(picture), {
    headers: { ...immutable(etag), "content-type": "image/webp", "content-length": String(picture.length) },
  });
});
