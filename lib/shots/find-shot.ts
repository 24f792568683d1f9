import { eq } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import { shots } from "@/db/schema/shots";
import type { Action } from "../auth/policy";
import { authorize, may } from "../auth/authorize";
import type { Actor } from "../context";
import { found } from "../errors";

export type ShotRow = typeof shots.$inferSelect;

/** The shot, once it is sure that the actor may do this with it. */
export async function findShot(
  db: Database | Transaction,
  actor: Actor,
  action: Action,
  shotId: string,
): Promise<ShotRow> {
  const [row] = await db.select().from(shots).where(eq(shots.id, shotId));
  // In the same words whether it is another production's or nobody's.
  const shot = found(row && may(actor, "production.see", row.productionId) ? row : undefined, "shot");
  authorize(actor, action, shot.productionId);
  return shot;
}
