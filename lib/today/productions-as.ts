import type { Role } from "@/db/enums";
import type { Actor } from "../context";

/** The productions in which a person holds just this role: what waits for them there is a matter of the role alone. */
export const productionsAs = (actor: Actor, role: Role): string[] =>
  [...actor.roles].filter(([, held]) => held === role).map(([id]) => id);
