import { sql } from "drizzle-orm";
import type { z } from "zod";
import type { Transaction } from "@/db/client";
import { deliveries, deliveryDocuments, deliveryFiles, deliveryItems } from "@/db/schema/deliveries";
import { authorize } from "../auth/authorize";
import type { Ctx } from "../context";
import { recordEvent } from "../events/record";
import { assemble, type Assembled } from "./assemble";
import { manifestPath } from "./compose-documents";
import { makeDeliverySchema } from "./schema";

/** Assembles signed-off frames under their delivered names, with the texts that go along. Nobody outside sees it yet. */
export async function makeDelivery(ctx: Ctx, input: z.infer<typeof makeDeliverySchema>) {
  authorize(ctx.actor, "delivery.make", input.production);
  return ctx.db.transaction(async (tx) => {
    // One delivery of a production at a time, so that two made at once are numbered apart.
    await tx.execute(
      sql`select pg_advisory_xact_lock(hashtextextended(${`deliveries ${input.production}`}, 0))`,
    );
    const made = await assemble(tx, input);
    const manifest = made.documents.find(({ path }) => path === manifestPath)!;
    const [delivery] = await tx
      .insert(deliveries)
      .values({
        productionId: input.production,
        number: made.number,
        title: input.title,
        words: input.words,
        manifestDigest: manifest.sha256,
        bytes: made.bytes,
        madeBy: ctx.actor.id,
      })
      .returning({ id: deliveries.id });
    await insertContents(tx, delivery!.id, input.production, made);
    await recordEvent(tx, {
      productionId: input.production,
      actorId: ctx.actor.id,
      kind: "delivery.made",
      subject: { by: ctx.actor.name, delivery: made.number, title: input.title, deliveryId: delivery!.id },
    });
    return { delivery: delivery!.id, number: made.number, files: made.files, bytes: made.bytes };
  });
}

/** PostgreSQL takes at most 65,535 values in one statement. */
const rowsPerInsert = 2000;

async function insertContents(
  tx: Transaction,
  deliveryId: string,
  productionId: string,
  made: Assembled,
): Promise<void> {
  for (const item of made.items) {
    const { versionId, verdictId, digest, first, last } = item;
    await tx
      .insert(deliveryItems)
      .values({ deliveryId, productionId, versionId, verdictId, digest, first, last });
    for (let start = 0; start < item.files.length; start += rowsPerInsert) {
      const rows = item.files.slice(start, start + rowsPerInsert);
      await tx.insert(deliveryFiles).values(rows.map((file) => ({ deliveryId, versionId, ...file })));
    }
  }
  const documents = made.documents.map(({ path, body, sha256 }) => ({ deliveryId, path, body, sha256 }));
  await tx.insert(deliveryDocuments).values(documents);
}
