// The one table of who may do what. Deny by default: an action that is not listed for a role is refused.
import type { Role } from "@/db/enums";

/** "owner" is the studio's owner, who belongs to every production; "member" is anyone in the production but a client. */
export type Standing = Role | "owner";

const members: readonly Standing[] = ["artist", "advisor", "producer", "owner"];

export const policy = {
  "production.see": members,
  "production.create": ["owner"],
  "people.see": ["producer", "owner"],
  "people.invite": ["producer", "owner"],
  "people.remove": ["producer", "owner"],
  "people.close": ["owner"],
  "studio.see": ["owner"],
  "studio.mail": ["owner"],
  "log.see": members,
  "shot.see": members,
  "shot.create": ["producer", "owner"],
  "shot.change": ["producer", "owner"],
  "setup.see": members,
  "setup.save": ["artist"],
  "version.see": members,
  "version.render": ["artist"],
  "version.cancel": ["artist", "producer", "owner"],
  "version.resume": ["artist", "producer", "owner"],
  "review.see": members,
  "review.send": ["artist"],
  "verdict.give": ["advisor"],
  "verdict.withdraw": ["advisor"],
  "delivery.make": ["producer"],
  "delivery.publish": ["producer"],
  "delivery.withdraw": ["producer"],
  "delivery.see": members,
  /** A client's own doors; the verb also asks that the delivery was published to this person. */
  "door.open": ["client"],
  "door.take": ["client"],
  "door.sign": ["client"],
} as const satisfies Record<string, readonly Standing[]>;

export type Action = keyof typeof policy;
