import { eq } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import { versions } from "@/db/schema/versions";
import { authorize, may } from "../auth/authorize";
import type { Action } from "../auth/policy";
import type { Actor } from "../context";
import { found } from "../errors";

export type VersionRow = typeof versions.$inferSelect;

/** The version, once it is sure that the actor may do this with it. */
export async function findVersion(
  db: Database | Transaction,
  actor: Actor,
  action: Action,
  versionId: string,
): Promise<VersionRow> {
  const [row] = await db.select().from(versions).where(eq(versions.id, versionId));
  // In the same words whether it is another production's or nobody's.
  const version = found(row && may(actor, "production.see", row.productionId) ? row : undefined, "version");
  authorize(actor, action, version.productionId);
  return version;
}
