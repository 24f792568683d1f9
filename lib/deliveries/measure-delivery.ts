import type { z } from "zod";
import { authorize } from "../auth/authorize";
import type { Ctx } from "../context";
import { assemble } from "./assemble";
import { measureDeliverySchema } from "./schema";

/** How many files and bytes a delivery would hold, and how they would be named, before it is made. */
export async function measureDelivery(ctx: Ctx, input: z.infer<typeof measureDeliverySchema>) {
  authorize(ctx.actor, "delivery.make", input.production);
  const { items, documents, files, bytes } = await assemble(ctx.db, input);
  const sizes = items.map((item) => ({
    version: item.versionId,
    files: item.files.length,
    bytes: item.files.reduce((sum, file) => sum + file.bytes, 0),
    firstPath: item.files[0]?.path ?? "",
    lastPath: item.files.at(-1)?.path ?? "",
  }));
  return { files, bytes, documents: documents.length, sizes };
}

export type DeliverySize = Awaited<ReturnType<typeof measureDelivery>>;
