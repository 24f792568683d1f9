import type { Database } from "@/db/client";
import type { Role } from "@/db/enums";

/** Who asks. Loaded from the database for every request, so that a person who leaves is out at once. */
export interface Actor {
  id: string;
  name: string;
  email: string;
  timeZone: string;
  isOwner: boolean;
  /** Their role in each production they belong to, by production id; null where they are there as the studio's owner alone. */
  roles: ReadonlyMap<string, Role | null>;
}

/** What every verb is handed: the database, who asks, and which request it is. */
export interface Ctx {
  db: Database;
  actor: Actor;
  requestId: string;
}
