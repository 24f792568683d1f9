import { buffer } from "node:stream/consumers";
import sharp from "sharp";
import type { z } from "zod";
import type { Ctx } from "../context";
import { openFrameFile } from "./open-frame-file";
import type { thumbnailInput } from "./schema";

// A few kilobytes each: enough for every shot of a large production.
const mostKept = 1000;
const kept = new Map<string, Buffer>();

/** A frame made small, from its stored PNG. The same frame always gives the same picture, so the latest ones are kept. */
export async function drawThumbnail(
  ctx: Ctx,
  { width, ...input }: z.infer<typeof thumbnailInput>,
): Promise<{ picture: Buffer; etag: string }> {
  const file = await openFrameFile(ctx, { ...input, kind: "png" });
  const etag = `${file.sha256}-${width}`;
  const known = kept.get(etag);
  if (known) return { picture: known, etag };

  const png = await buffer(await file.open());
  const picture = await sharp(png)
    .resize({ width, withoutEnlargement: true })
    .webp({ quality: 82 })
    .toBuffer();
  kept.set(etag, picture);
  if (kept.size > mostKept) kept.delete(kept.keys().next().value ?? etag);
  return { picture, etag };
}
