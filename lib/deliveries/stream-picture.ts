import { buffer } from "node:stream/consumers";
import { and, asc, eq } from "drizzle-orm";
import sharp from "sharp";
import type { z } from "zod";
import { deliveryFiles } from "@/db/schema/deliveries";
import type { Ctx } from "../context";
import { found } from "../errors";
import { findDoor, refuseShut } from "./find-door";
import { openEntry } from "./open-entry";
import { pictureSchema } from "./schema";

const widest = 960;

/** A look at a delivered PNG, made small for the page. A set without PNG files has none: no frame but a delivered one is shown. */
export async function streamPicture(ctx: Ctx, input: z.infer<typeof pictureSchema>): Promise<Response> {
  refuseShut(await findDoor(ctx, "door.open", input.delivery));
  const frames = await ctx.db
    .select({ path: deliveryFiles.path, sha256: deliveryFiles.sha256, bytes: deliveryFiles.bytes })
    .from(deliveryFiles)
    .where(
      and(
        eq(deliveryFiles.deliveryId, input.delivery),
        eq(deliveryFiles.versionId, input.version),
        eq(deliveryFiles.kind, "png"),
      ),
    )
    .orderBy(asc(deliveryFiles.frame));
  const middle = found(frames[Math.floor(frames.length / 2)], "picture in this delivery");
  const source = await buffer(await openEntry(middle));
  const small = await sharp(source).resize({ width: widest, withoutEnlargement: true }).png().toBuffer();
  return new Response(new Uint8Array(small), {
    headers: { "content-type": "image/png", "cache-control": "private, no-store" },
  });
}
