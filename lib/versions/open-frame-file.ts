import { and, eq } from "drizzle-orm";
import type { Readable } from "node:stream";
import type { z } from "zod";
import { frameFiles } from "@/db/schema/versions";
import { frameDigits, frameName } from "@/render/files/frame-names";
import type { Setup } from "@/render/scene/setup";
import type { Ctx } from "../context";
import { found } from "../errors";
import { storage } from "../storage/storage";
import type { ByteRange } from "../storage/stored-file";
import { fileStem } from "./frame-names";
import { findVersion } from "./find-version";
import { nameVersion } from "./name-version";
import type { FileLine, frameFileInput } from "./schema";

export interface OpenFile extends FileLine {
  open(range?: ByteRange): Promise<Readable>;
}

/** One file of a frame, for members of the production; clients have their deliveries. */
export async function openFrameFile(ctx: Ctx, input: z.infer<typeof frameFileInput>): Promise<OpenFile> {
  const { id, setup } = await findVersion(ctx.db, ctx.actor, "version.see", input.version);
  const { frame, kind } = input;
  const [row] = await ctx.db
    .select()
    .from(frameFiles)
    .where(and(eq(frameFiles.versionId, id), eq(frameFiles.frame, frame), eq(frameFiles.kind, kind)));
  const { sha256, bytes } = found(row, "frame");
  const { shot, number } = await nameVersion(ctx.db, id);
  const name = frameName(fileStem(shot, number), frame, frameDigits(JSON.parse(setup) as Setup), kind);
  return { frame, kind, sha256, bytes, name, open: (range) => storage().open(sha256, range) };
}
