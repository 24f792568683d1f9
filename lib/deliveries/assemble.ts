import { desc, eq } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import { deliveries } from "@/db/schema/deliveries";
import { productions } from "@/db/schema/productions";
import { found } from "../errors";
import { composeDocuments } from "./compose-documents";
import { planDelivery } from "./plan-delivery";
import type { MeasureDelivery } from "./schema";

/** The whole package as it would be made now, before anything is written. */
export async function assemble(db: Database | Transaction, input: MeasureDelivery) {
  const [production] = await db
    .select({ name: productions.name, code: productions.code })
    .from(productions)
    .where(eq(productions.id, input.production));
  const { name, code } = found(production, "production");
  const number = (await findLastNumber(db, input.production)) + 1;
  const items = await planDelivery(db, input);
  const documents = composeDocuments({
    production: name,
    number,
    title: input.title,
    words: input.words,
    items,
  });
  const files = items.flatMap((item) => item.files);
  const bytes = [...files, ...documents].reduce((sum, file) => sum + file.bytes, 0);
  return { code, number, items, documents, files: files.length + documents.length, bytes };
}

export type Assembled = Awaited<ReturnType<typeof assemble>>;

async function findLastNumber(db: Database | Transaction, productionId: string): Promise<number> {
  const [last] = await db
    .select({ number: deliveries.number })
    .from(deliveries)
    .where(eq(deliveries.productionId, productionId))
    .orderBy(desc(deliveries.number))
    .limit(1);
  return last?.number ?? 0;
}
