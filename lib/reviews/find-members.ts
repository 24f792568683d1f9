import { and, eq, inArray, isNull } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import type { Role } from "@/db/enums";
import { memberships, people } from "@/db/schema/people";

export interface Member {
  id: string;
  name: string;
  email: string;
  role: Role;
}

/** Who holds these roles in the production now, in the order of their names. */
export async function findMembers(
  db: Database | Transaction,
  productionId: string,
  roles: readonly Role[],
): Promise<Member[]> {
  return db
    .select({ id: people.id, name: people.name, email: people.email, role: memberships.role })
    .from(memberships)
    .innerJoin(people, eq(people.id, memberships.personId))
    .where(
      and(
        eq(memberships.productionId, productionId),
        inArray(memberships.role, [...roles]),
        isNull(memberships.endedAt),
        isNull(people.leftAt),
      ),
    )
    .orderBy(people.name, people.id);
}

/** Who is told of a verdict on a version: its maker, whoever sent it, and the producers; never the one who gave it. */
export async function findConcerned(
  db: Database | Transaction,
  version: { productionId: string; madeBy: string; sentBy: string | null },
  actorId: string,
): Promise<Member[]> {
  const members = await findMembers(db, version.productionId, ["artist", "producer"]);
  return members.filter(
    ({ id, role }) =>
      id !== actorId && (role === "producer" || id === version.madeBy || id === version.sentBy),
  );
}
