// What tests of invitations, resets and sign-in share.
import { eq } from "drizzle-orm";
import type { Database } from "@/db/client";
import { outbox } from "@/db/schema/events";
import { people } from "@/db/schema/people";
import { mailPayloadSchema } from "@/lib/mail/schema";
import { createPerson } from "@/lib/people/create-person";
import { tokenOf } from "@/lib/people/token";

export const goodPassword = "four unrelated words";

/** What every process is told from outside; the URL is the test's own database. */
export function prepareEnvironment(databaseUrl: string): void {
  process.env.DATABASE_URL = databaseUrl;
  process.env.NEXTAUTH_SECRET = "0123456789abcdef0123456789abcdef";
}

export async function addAccount(db: Database, email: string, name = "Odo Ferrand") {
  return db.transaction((tx) => createPerson(tx, { email, name, password: goodPassword, timeZone: "UTC" }));
}

/** The letters waiting for an address, oldest first. */
export async function lettersTo(db: Database, email: string) {
  const rows = await db.select().from(outbox).where(eq(outbox.kind, "mail")).orderBy(outbox.createdAt);
  return rows.map(({ payload }) => mailPayloadSchema.parse(payload)).filter(({ to }) => to === email);
}

/** The token in the newest letter to an address, as its reader would have it. */
export async function newestToken(db: Database, email: string): Promise<string> {
  const link = (await lettersTo(db, email)).findLast(({ action }) => action?.link)?.action?.link;
  if (!link) throw new Error(`No letter with a link waits for ${email}.`);
  return tokenOf(link);
}

export async function accountOf(db: Database, email: string) {
  const [row] = await db.select().from(people).where(eq(people.email, email));
  if (!row) throw new Error(`${email} has no account.`);
  return row;
}
