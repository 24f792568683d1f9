import { sql } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import type { Role } from "@/db/enums";
import { memberships } from "@/db/schema/people";
import { DomainError } from "../errors";
import { recordEvent } from "../events/record";

export interface NewMember {
  productionId: string;
  person: { id: string; name: string };
  role: Role;
}

/** Puts a person into a production, or back into it. No asking of authority: callers have done that. */
export async function addMember(tx: Transaction, { productionId, person, role }: NewMember): Promise<void> {
  const added = await tx
    .insert(memberships)
    .values({ productionId, personId: person.id, role })
    .onConflictDoUpdate({
      target: [memberships.productionId, memberships.personId],
      set: { role, endedAt: null, createdAt: new Date() },
      setWhere: sql`${memberships.endedAt} is not null`,
    })
    .returning({ role: memberships.role });
  if (added.length === 0) throw new DomainError("conflict", `${person.name} is in this production already.`);
  await recordEvent(tx, {
    productionId,
    actorId: person.id,
    kind: "person.joined",
    subject: { personId: person.id, by: person.name, role },
  });
}
