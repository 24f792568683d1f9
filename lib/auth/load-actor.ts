import { and, eq, isNull } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import { memberships, people } from "@/db/schema/people";
import { productions } from "@/db/schema/productions";
import type { Actor } from "../context";

/** The actor behind a session; null once they have left, or their password changed after the session began. */
export async function loadActor(
  db: Database | Transaction,
  personId: string,
  epoch?: number,
): Promise<Actor | null> {
  const [person] = await db
    .select()
    .from(people)
    .where(and(eq(people.id, personId), isNull(people.leftAt)));
  if (!person || (epoch !== undefined && person.sessionEpoch !== epoch)) return null;

  const held = await db
    .select({ productionId: memberships.productionId, role: memberships.role })
    .from(memberships)
    .where(and(eq(memberships.personId, personId), isNull(memberships.endedAt)));
  const roles: Actor["roles"] = new Map(held.map(({ productionId, role }) => [productionId, role]));
  const { id, name, email, timeZone, isOwner } = person;
  return {
    id,
    name,
    email,
    timeZone,
    isOwner,
    roles: isOwner ? await withEveryProduction(db, roles) : roles,
  };
}

/** The owner belongs to every production; where they hold no role, the policy knows them as owner alone. */
async function withEveryProduction(
  db: Database | Transaction,
  roles: Actor["roles"],
): Promise<Actor["roles"]> {
  const all = await db.select({ id: productions.id }).from(productions);
  return new Map(all.map(({ id }) => [id, roles.get(id) ?? null]));
}
