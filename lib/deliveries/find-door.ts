import { and, eq } from "drizzle-orm";
import { recipients } from "@/db/schema/deliveries";
import { authorize, may } from "../auth/authorize";
import type { Action } from "../auth/policy";
import type { Ctx } from "../context";
import { DomainError, found } from "../errors";
import { frameWords } from "../reviews/schema-declaration";
import { findDelivery, type FoundDelivery } from "./find-delivery";
import { findStops, type Stop } from "./find-stops";

export type DoorState =
  | { kind: "open"; until: string }
  | { kind: "stopped"; until: string; why: string[] }
  | { kind: "closed"; why: string[] };

export interface Door {
  delivery: FoundDelivery;
  state: DoorState;
}

/**
 * A client's own door, in whatever state it is. Someone it was not published to learns only that there is no such
 * delivery; a member of the production, that this is not theirs to do.
 */
export async function findDoor(ctx: Ctx, action: Action, deliveryId: string): Promise<Door> {
  const delivery = await findDelivery(ctx.db, deliveryId);
  const [row] = await ctx.db
    .select({ expiresAt: recipients.expiresAt, revokedAt: recipients.revokedAt })
    .from(recipients)
    .where(and(eq(recipients.deliveryId, deliveryId), eq(recipients.personId, ctx.actor.id)));
  const theirs =
    row &&
    row.revokedAt === null &&
    delivery.publishedAt !== null &&
    ctx.actor.roles.has(delivery.productionId);
  if (!theirs && !may(ctx.actor, "delivery.see", delivery.productionId)) found(undefined, "delivery");
  authorize(ctx.actor, action, delivery.productionId);
  const { expiresAt } = found(theirs ? row : undefined, "delivery");
  const stops = await findStops(ctx.db, [deliveryId]);
  return { delivery, state: stateOf(delivery, expiresAt, stops) };
}

export function stateOf(
  delivery: Pick<FoundDelivery, "withdrawnAt" | "withdrawnWords">,
  expiresAt: Date,
  stops: Stop[],
): DoorState {
  const until = expiresAt.toISOString();
  if (delivery.withdrawnAt)
    return {
      kind: "closed",
      why: ["The studio has withdrawn this delivery.", `“${delivery.withdrawnWords}”`],
    };
  if (stops.length > 0) return { kind: "stopped", until, why: stops.map(describeStop) };
  if (expiresAt.getTime() > Date.now()) return { kind: "open", until };
  return {
    kind: "closed",
    why: [
      `This delivery could be taken until ${until.slice(0, 10)}. Ask the studio's producer to deliver it again.`,
    ],
  };
}

/** Why downloads are stopped. The advisor's words are the recipients' only where they were written for them. */
export function describeStop(stop: Stop): string {
  const frames = `${frameWords(stop.first, stop.last)} of ${stop.shotCode}`;
  return stop.kind === "withdrawn"
    ? `The science advisor has withdrawn the sign-off of ${frames}: “${stop.words}”`
    : `The science advisor no longer signs ${frames}.`;
}

/** Throws unless the door is open, saying why it is not. */
export function refuseShut({ state }: Door): void {
  if (state.kind === "open") return;
  const stopped = state.kind === "stopped" ? "Downloads of this delivery are stopped. " : "";
  throw new DomainError("gone", stopped + state.why.join(" "));
}
