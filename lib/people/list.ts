import { and, asc, desc, eq, gt, inArray, isNull } from "drizzle-orm";
import type { Database } from "@/db/client";
import { links, memberships, people } from "@/db/schema/people";
import { productions } from "@/db/schema/productions";
import { may, productionsWhere } from "../auth/authorize";
import type { Ctx } from "../context";
import { DomainError } from "../errors";

/** Who is in which production, and who is asked to be: for each production whose people the actor may see. */
export async function listPeople({ db, actor }: Ctx) {
  const scope = productionsWhere(actor, "people.see");
  if (scope.length === 0 && !may(actor, "studio.see", null))
    throw new DomainError("forbidden", "Only producers and the studio's owner see who is in a production.");
  const [all, members, invitations] = await Promise.all([
    db.select().from(productions).where(inArray(productions.id, scope)).orderBy(asc(productions.code)),
    readMembers(db, scope),
    readInvitations(db, scope),
  ]);
  return {
    mayCreate: may(actor, "production.create", null),
    mayClose: may(actor, "people.close", null),
    accounts: may(actor, "people.close", null) ? await readAccounts(db) : [],
    productions: all.map(({ id, code, name, kind }) => ({
      id,
      code,
      name,
      kind,
      members: members.filter((member) => member.productionId === id),
      invitations: invitations.filter((invitation) => invitation.productionId === id),
    })),
  };
}

async function readMembers(db: Database, scope: string[]) {
  const rows = await db
    .select({
      productionId: memberships.productionId,
      personId: people.id,
      name: people.name,
      email: people.email,
      role: memberships.role,
      since: memberships.createdAt,
    })
    .from(memberships)
    .innerJoin(people, eq(people.id, memberships.personId))
    .where(and(inArray(memberships.productionId, scope), isNull(memberships.endedAt), isNull(people.leftAt)))
    .orderBy(asc(memberships.role), asc(people.name));
  return rows.map(({ since, ...row }) => ({ ...row, since: since.toISOString() }));
}

async function readInvitations(db: Database, scope: string[]) {
  const rows = await db
    .select({
      id: links.id,
      productionId: links.productionId,
      name: links.name,
      email: links.email,
      role: links.role,
      by: people.name,
      expiresAt: links.expiresAt,
    })
    .from(links)
    .innerJoin(people, eq(people.id, links.createdBy))
    .where(
      and(
        eq(links.purpose, "invitation"),
        inArray(links.productionId, scope),
        isNull(links.usedAt),
        isNull(links.revokedAt),
        gt(links.expiresAt, new Date()),
      ),
    )
    .orderBy(desc(links.createdAt));
  return rows.map(({ expiresAt, ...row }) => ({ ...row, expiresAt: expiresAt.toISOString() }));
}

async function readAccounts(db: Database) {
  return db
    .select({ id: people.id, name: people.name, email: people.email, isOwner: people.isOwner })
    .from(people)
    .where(isNull(people.leftAt))
    .orderBy(asc(people.name));
}
