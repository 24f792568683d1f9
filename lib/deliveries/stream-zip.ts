import type { z } from "zod";
import type { Ctx } from "../context";
import { findContents, findSet } from "./find-contents";
import { findDoor, refuseShut } from "./find-door";
import { packageName } from "./lay-out";
import { takeZipSchema } from "./schema";
import { sendBytes } from "./send-bytes";
import { measureZip, zipEntries } from "./zip-entries";

/** The package as one archive, or one version's set of it; it can be broken off and resumed. */
export async function streamZip(
  ctx: Ctx,
  input: z.infer<typeof takeZipSchema>,
  request: Request,
): Promise<Response> {
  const door = await findDoor(ctx, "door.take", input.delivery);
  refuseShut(door);
  const { delivery } = door;
  const set = input.set ? await findSet(ctx.db, delivery.id, input.set) : undefined;
  const folder = packageName(delivery.productionCode, delivery.number);
  const entries = await findContents(ctx.db, delivery.id, set);
  return sendBytes(
    ctx,
    {
      delivery: delivery.id,
      what: set?.words ?? "everything",
      fileName: `${folder}${set ? `-${set.name}` : ""}.zip`,
      type: "application/zip",
      bytes: measureZip(folder, entries),
      tag: `${delivery.manifestDigest}-${set?.name ?? "all"}`,
      open: async () => zipEntries(folder, entries),
    },
    request,
  );
}
