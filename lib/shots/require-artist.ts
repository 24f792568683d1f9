import { and, eq, isNull } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { memberships, people } from "@/db/schema/people";
import { DomainError } from "../errors";

/** Refuses to give a shot to anyone but a present artist of its production; returns the artist's name. */
export async function requireArtist(
  tx: Transaction,
  productionId: string,
  personId: string,
): Promise<string> {
  const [artist] = await tx
    .select({ name: people.name })
    .from(memberships)
    .innerJoin(people, eq(people.id, memberships.personId))
    .where(
      and(
        eq(memberships.productionId, productionId),
        eq(memberships.personId, personId),
        eq(memberships.role, "artist"),
        isNull(memberships.endedAt),
        isNull(people.leftAt),
      ),
    );
  if (artist) return artist.name;
  throw new DomainError("invalid", "A shot is given to an artist of its own production.", "artist");
}
