import type { z } from "zod";
import type { Ctx } from "../context";
import { found } from "../errors";
import { findDoor, refuseShut } from "./find-door";
import { findEntry } from "./find-entry";
import { openEntry } from "./open-entry";
import { takeFileSchema } from "./schema";
import { sendBytes } from "./send-bytes";

const types: Record<string, string> = {
  png: "image/png",
  exr: "image/x-exr",
  txt: "text/plain; charset=utf-8",
  json: "application/json",
};

/** One file of the package under its delivered name, whole or in part. */
export async function streamFile(
  ctx: Ctx,
  input: z.infer<typeof takeFileSchema>,
  request: Request,
): Promise<Response> {
  const door = await findDoor(ctx, "door.take", input.delivery);
  refuseShut(door);
  const path = input.path.join("/");
  const entry = found(await findEntry(ctx.db, input.delivery, path), "file in this delivery");
  const fileName = input.path.at(-1)!;
  return sendBytes(
    ctx,
    {
      delivery: input.delivery,
      what: path,
      fileName,
      type: types[fileName.split(".").at(-1)!] ?? "application/octet-stream",
      bytes: entry.bytes,
      tag: entry.sha256,
      open: () => openEntry(entry),
    },
    request,
  );
}
