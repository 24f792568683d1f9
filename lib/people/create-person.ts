import { and, eq, isNotNull, sql } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { people } from "@/db/schema/people";
import { hashPassword } from "../auth/password";
import { DomainError } from "../errors";
import { recordEvent } from "../events/record";

export interface NewPerson {
  email: string;
  name: string;
  password: string;
  timeZone: string;
}

/** An account. One that was closed is opened again, with the new name and password. */
export async function createPerson(
  tx: Transaction,
  person: NewPerson,
): Promise<{ id: string; name: string }> {
  const { email, name, timeZone } = person;
  const passwordHash = await hashPassword(person.password);
  const [made] = await tx
    .insert(people)
    .values({ email, name, timeZone, passwordHash })
    .onConflictDoNothing({ target: people.email })
    .returning({ id: people.id, name: people.name });
  if (made) return made;
  const [reopened] = await tx
    .update(people)
    .set({ name, timeZone, passwordHash, leftAt: null, sessionEpoch: sql`${people.sessionEpoch} + 1` })
    .where(and(eq(people.email, email), isNotNull(people.leftAt)))
    .returning({ id: people.id, name: people.name });
  if (reopened) return reopened;
  throw new DomainError(
    "conflict",
    "An account with this e-mail address was made this moment. Open the link again and write its password.",
  );
}

/** The studio's owner, and the first line of the studio's own log. There is one owner. */
export async function createOwner(tx: Transaction, owner: NewPerson & { studio: string }) {
  const others = await tx.select({ id: people.id }).from(people).where(eq(people.isOwner, true));
  if (others.length > 0) throw new DomainError("conflict", "The studio has an owner already.");
  const made = await createPerson(tx, owner);
  await tx.update(people).set({ isOwner: true }).where(eq(people.id, made.id));
  await recordEvent(tx, {
    productionId: null,
    actorId: made.id,
    kind: "studio.made",
    subject: { studio: owner.studio, by: made.name },
  });
  return made;
}
