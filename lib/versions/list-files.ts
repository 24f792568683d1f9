import { and, asc, eq, gte } from "drizzle-orm";
import type { z } from "zod";
import { frameFiles } from "@/db/schema/versions";
import { frameDigits, frameName } from "@/render/files/frame-names";
import type { Setup } from "@/render/scene/setup";
import type { Ctx } from "../context";
import { fileStem } from "./frame-names";
import { findVersion } from "./find-version";
import { nameVersion } from "./name-version";
import type { FileLine, filesInput } from "./schema";

const pageLength = 200;

/** A version's files from a frame on, a hundred frames at a time; `next` is the frame the rest begins at. */
export async function listFiles(
  ctx: Ctx,
  input: z.infer<typeof filesInput>,
): Promise<{ files: FileLine[]; next: number | null }> {
  const { id, setup } = await findVersion(ctx.db, ctx.actor, "version.see", input.version);
  const { shot, number } = await nameVersion(ctx.db, id);
  const digits = frameDigits(JSON.parse(setup) as Setup);
  const rows = await ctx.db
    .select()
    .from(frameFiles)
    .where(and(eq(frameFiles.versionId, id), gte(frameFiles.frame, input.from)))
    .orderBy(asc(frameFiles.frame), asc(frameFiles.kind))
    .limit(pageLength + 1);
  const files = rows.slice(0, pageLength).map(({ frame, kind, sha256, bytes }) => {
    return { frame, kind, sha256, bytes, name: frameName(fileStem(shot, number), frame, digits, kind) };
  });
  return { files, next: rows[pageLength]?.frame ?? null };
}
