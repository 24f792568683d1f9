import { asc, inArray } from "drizzle-orm";
import type { Role } from "@/db/enums";
import { productions } from "@/db/schema/productions";
import { productionsWhere } from "../auth/authorize";
import type { Ctx } from "../context";

/** The productions the actor may see, and what they are there; null where they are there as the studio's owner. */
export async function listProductions({ db, actor }: Ctx) {
  const rows = await db
    .select({ id: productions.id, code: productions.code, name: productions.name, kind: productions.kind })
    .from(productions)
    .where(inArray(productions.id, productionsWhere(actor, "production.see")))
    .orderBy(asc(productions.code));
  return rows.map((row) => ({ ...row, role: (actor.roles.get(row.id) ?? null) satisfies Role | null }));
}
