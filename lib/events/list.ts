import { desc, inArray } from "drizzle-orm";
import { events } from "@/db/schema/events";
import { productionsWhere } from "../auth/authorize";
import type { Ctx } from "../context";
import { sentenceOf } from "./sentence";

export interface EventLine {
  id: number;
  at: string;
  sentence: string;
  productionId: string | null;
}

/** The newest events of the productions whose log the actor may see, as sentences, newest first. */
export async function listEvents({ db, actor }: Ctx, { limit }: { limit: number }): Promise<EventLine[]> {
  const rows = await db
    .select()
    .from(events)
    .where(inArray(events.productionId, productionsWhere(actor, "log.see")))
    .orderBy(desc(events.at), desc(events.id))
    .limit(limit);
  return rows.map(({ id, at, kind, subject, productionId }) => ({
    id,
    at: at.toISOString(),
    sentence: sentenceOf(kind, subject),
    productionId,
  }));
}
