import { and, asc, eq, inArray, isNull } from "drizzle-orm";
import type { Database } from "@/db/client";
import { deliveries, deliveryItems, recipients } from "@/db/schema/deliveries";
import { memberships, people } from "@/db/schema/people";
import type { Role } from "@/db/enums";
import type { Holder } from "./schema";
import type { Standing } from "./schema-standing";

interface Person {
  id: string;
  name: string;
}

/** Who has which shot: it follows from the standing, as everything else does. */
export interface Holders {
  holderOf(standing: Standing, artistId: string | null, versionId: string | null): Holder;
  artists: Person[];
  /** Every person who can have a shot. */
  everyone: Person[];
}

/** In these standings it is the artist's turn. */
const withArtist = new Set<Standing>(["open", "stopped", "ready", "returned"]);

export async function findHolders(db: Database, production: string, versionIds: string[]): Promise<Holders> {
  const [members, clients] = await Promise.all([readMembers(db, production), readClients(db, versionIds)]);
  const withRole = (role: Role) => members.filter((member) => member.role === role);
  const holderOf: Holders["holderOf"] = (standing, artistId, versionId) => {
    if (standing === "rendering") return { kind: "queue" };
    if (withArtist.has(standing)) return oneOf(members.filter(({ id }) => id === artistId));
    if (standing === "in review") return oneOf(withRole("advisor"));
    if (standing === "signed off" || standing === "refused") return oneOf(withRole("producer"));
    if (standing === "delivered") return oneOf(clients.filter((client) => client.versionId === versionId));
    return { kind: "nobody" };
  };
  const bare = ({ id, name }: Person): Person => ({ id, name });
  const everyone = [...new Map([...members, ...clients].map((person) => [person.id, bare(person)])).values()];
  return { holderOf, artists: withRole("artist").map(bare), everyone };
}

function oneOf(persons: Person[]): Holder {
  const [first, ...others] = persons;
  if (!first) return { kind: "nobody" };
  return { kind: "person", id: first.id, name: [first, ...others].map(({ name }) => name).join(" or ") };
}

function readMembers(db: Database, production: string) {
  return db
    .select({ id: people.id, name: people.name, role: memberships.role })
    .from(memberships)
    .innerJoin(people, eq(people.id, memberships.personId))
    .where(
      and(
        eq(memberships.productionId, production),
        inArray(memberships.role, ["artist", "advisor", "producer"]),
        isNull(memberships.endedAt),
        isNull(people.leftAt),
      ),
    )
    .orderBy(asc(people.name), asc(people.id));
}

function readClients(db: Database, versionIds: string[]) {
  return db
    .selectDistinct({ id: people.id, name: people.name, versionId: deliveryItems.versionId })
    .from(deliveryItems)
    .innerJoin(deliveries, eq(deliveries.id, deliveryItems.deliveryId))
    .innerJoin(recipients, eq(recipients.deliveryId, deliveries.id))
    .innerJoin(people, eq(people.id, recipients.personId))
    .where(
      and(
        inArray(deliveryItems.versionId, versionIds),
        isNull(recipients.revokedAt),
        isNull(deliveries.withdrawnAt),
      ),
    )
    .orderBy(asc(people.name), asc(people.id));
}
