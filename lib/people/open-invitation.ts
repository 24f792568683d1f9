import { and, eq, isNull } from "drizzle-orm";
import type { z } from "zod";
import type { Database } from "@/db/client";
import { people } from "@/db/schema/people";
import { productions } from "@/db/schema/productions";
import { found } from "../errors";
import { findLink } from "./find-link";
import type { linkInput } from "./schema";

/** What an invitation says to the one who holds it, before they accept. */
export async function openInvitation({ db }: { db: Database }, { token }: z.infer<typeof linkInput>) {
  const link = await findLink(db, "invitation", token);
  const [production] = await db
    .select({ name: productions.name })
    .from(productions)
    .where(eq(productions.id, link.productionId!));
  const [inviter] = await db.select({ name: people.name }).from(people).where(eq(people.id, link.createdBy!));
  const [account] = await db
    .select({ id: people.id })
    .from(people)
    .where(and(eq(people.email, link.email), isNull(people.leftAt)));
  return {
    production: found(production, "production").name,
    role: link.role!,
    by: inviter?.name ?? "The studio",
    email: link.email,
    name: link.name,
    personId: account?.id ?? null,
    expiresAt: link.expiresAt.toISOString(),
  };
}
