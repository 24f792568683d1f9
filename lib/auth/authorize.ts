import type { Actor } from "../context";
import { DomainError } from "../errors";
import { policy, type Action, type Standing } from "./policy";

const refusals: Partial<Record<Action, string>> = {
  "production.create": "Only the studio's owner can begin a production.",
  "people.see": "Only producers and the studio's owner see who is in a production.",
  "people.invite": "Only a producer of this production, or the studio's owner, can invite people into it.",
  "people.remove": "Only a producer of this production, or the studio's owner, can end a membership.",
  "people.close": "Only the studio's owner can close an account.",
  "studio.see": "Only the studio's owner can see this.",
  "studio.mail": "Only the studio's owner can read the local mail.",
  "setup.save": "Only an artist of this production can change a setup.",
  "version.render": "Only an artist of this production can render a version.",
  "review.send": "Only an artist of this production can send a version for review.",
  "verdict.give": "Only this production's science advisor can give a verdict.",
  "verdict.withdraw": "Only this production's science advisor can withdraw a verdict.",
  "delivery.make": "Only a producer of this production can make a delivery.",
  "delivery.publish": "Only a producer of this production can publish a delivery.",
  "door.take": "Only the client a delivery was published to can take it.",
  "door.sign": "Only the client a delivery was published to can sign its receipt.",
};

const holds = (actor: Actor, productionId: string | null): Standing[] => {
  const role = productionId === null ? undefined : actor.roles.get(productionId);
  return [...(role ? [role] : []), ...(actor.isOwner ? (["owner"] as const) : [])];
};

/** Whether the policy lets the actor do it in this production (null: in the studio itself). */
export function may(actor: Actor, action: Action, productionId: string | null): boolean {
  const allowed: readonly Standing[] = policy[action];
  return holds(actor, productionId).some((standing) => allowed.includes(standing));
}

/**
 * Throws unless the policy lets the actor do it. Someone outside the production, and a client outside what is theirs,
 * learns only that there is no such thing.
 */
export function authorize(actor: Actor, action: Action, productionId: string | null): void {
  if (may(actor, action, productionId)) return;
  if (productionId !== null && !may(actor, "production.see", productionId) && !action.startsWith("door."))
    throw new DomainError("not-found", "There is no such thing here, or it is not yours to see.");
  throw new DomainError("forbidden", refusals[action] ?? "Your role in this production does not allow this.");
}

/** The productions in which the actor may do this: the scope of every list. */
export function productionsWhere(actor: Actor, action: Action): string[] {
  return [...actor.roles.keys()].filter((productionId) => may(actor, action, productionId));
}
