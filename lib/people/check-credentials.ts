import { and, eq, isNull } from "drizzle-orm";
import type { Database } from "@/db/client";
import { people } from "@/db/schema/people";
import { countTry, forgetTries, giveTryBack } from "../auth/limits";
import { verifyPassword } from "../auth/password";

export interface Credentials {
  email: string;
  password: string;
  /** Where the try comes from, for counting. */
  from: string;
}

/** The person whose e-mail and password these are, or null. An unknown address takes as long and reads the same as a wrong password. */
export async function checkCredentials(db: Database, { email, password, from }: Credentials) {
  const pair = `${email} ${from}`;
  await countTry(db, "sign-in by address and machine", pair);
  await countTry(db, "sign-in by machine", from);
  await countTry(db, "sign-in by address", email);

  const [person] = await db
    .select({
      id: people.id,
      name: people.name,
      email: people.email,
      epoch: people.sessionEpoch,
      passwordHash: people.passwordHash,
    })
    .from(people)
    .where(and(eq(people.email, email), isNull(people.leftAt)));
  if (!(await verifyPassword(person?.passwordHash, password)) || !person) return null;

  await forgetTries(db, "sign-in by address and machine", pair);
  await giveTryBack(db, "sign-in by machine", from);
  await giveTryBack(db, "sign-in by address", email);
  const { id, name, epoch } = person;
  return { id, name, email, epoch };
}
