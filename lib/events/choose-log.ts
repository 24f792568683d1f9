import { asc, inArray } from "drizzle-orm";
import { productions } from "@/db/schema/productions";
import { authorize, may, productionsWhere } from "../auth/authorize";
import type { Ctx } from "../context";

/** The logs the actor may read: their productions', and the studio's own for its owner. */
export async function listLogs({ db, actor }: Ctx): Promise<{ id: string; name: string }[]> {
  const rows = await db
    .select({ id: productions.id, name: productions.name })
    .from(productions)
    .where(inArray(productions.id, productionsWhere(actor, "log.see")))
    .orderBy(asc(productions.code));
  return may(actor, "studio.see", null) ? [...rows, { id: "studio", name: "The studio itself" }] : rows;
}

/** Refuses a log that is not the actor's to read. A production's id and the word "studio" are the chain's own names. */
export function authorizeLog({ actor }: Pick<Ctx, "actor">, chain: string): void {
  if (chain === "studio") authorize(actor, "studio.see", null);
  else authorize(actor, "log.see", chain);
}
