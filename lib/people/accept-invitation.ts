import { and, eq, isNull } from "drizzle-orm";
import type { z } from "zod";
import { people } from "@/db/schema/people";
import { countTry } from "../auth/limits";
import type { Actor, Ctx } from "../context";
import { DomainError } from "../errors";
import { addMember } from "./add-member";
import { checkCredentials } from "./check-credentials";
import { createPerson } from "./create-person";
import { findLink, useLink } from "./find-link";
import type { joinAsKnownInput, joinAsNewInput } from "./schema";

/** What is known of someone who holds a link: the database, and where they ask from. */
export type Open = Pick<Ctx, "db"> & { from: string };

/** Accepts an invitation for an address that has no account: makes the account and the membership. */
export async function joinAsNew(
  open: Open,
  input: z.infer<typeof joinAsNewInput>,
): Promise<{ email: string }> {
  const link = await tryInvitation(open, input.token);
  const { name, password, timeZone } = input;
  await open.db.transaction(async (tx) => {
    await useLink(tx, link);
    const person = await createPerson(tx, { email: link.email, name, password, timeZone });
    await addMember(tx, { productionId: link.productionId!, person, role: link.role! });
  });
  return { email: link.email };
}

/** Accepts an invitation for an address that has an account, whose holder is signed in or proves the password. */
export async function joinAsKnown(
  open: Open & { signedIn: Actor | null },
  input: z.infer<typeof joinAsKnownInput>,
): Promise<{ email: string }> {
  const link = await tryInvitation(open, input.token);
  const person = await provePerson(open, link.email, input.password);
  await open.db.transaction(async (tx) => {
    await useLink(tx, link);
    await addMember(tx, { productionId: link.productionId!, person, role: link.role! });
  });
  return { email: link.email };
}

async function tryInvitation(open: Open, token: string) {
  await countTry(open.db, "link tried by machine", open.from);
  return findLink(open.db, "invitation", token);
}

async function provePerson(open: Open & { signedIn: Actor | null }, email: string, password = "") {
  if (open.signedIn?.email === email) return open.signedIn;
  const [account] = await open.db
    .select({ id: people.id })
    .from(people)
    .where(and(eq(people.email, email), isNull(people.leftAt)));
  if (!account)
    throw new DomainError("conflict", "This address has no account yet. Open the link again and make one.");
  const person = await checkCredentials(open.db, { email, password, from: open.from });
  if (!person)
    throw new DomainError(
      "invalid",
      `This is not the password of ${email}. Try again, or reset it first.`,
      "password",
    );
  return person;
}
