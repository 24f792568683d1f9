import type { z } from "zod";
import type { Ctx } from "../context";
import { findContents, findSet } from "./find-contents";
import { findDoor, refuseShut } from "./find-door";
import { takeZipSchema } from "./schema";

/** Every file behind a client's door, or of one set: path, checksum and length. It is what "Check what arrived" compares with. */
export async function listDoorFiles(ctx: Ctx, input: z.infer<typeof takeZipSchema>) {
  refuseShut(await findDoor(ctx, "door.open", input.delivery));
  const set = input.set ? await findSet(ctx.db, input.delivery, input.set) : undefined;
  const entries = await findContents(ctx.db, input.delivery, set);
  return { files: entries.map(({ path, sha256, bytes }) => ({ path, sha256, bytes })) };
}

export type DoorFile = Awaited<ReturnType<typeof listDoorFiles>>["files"][number];
