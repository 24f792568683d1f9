// Who the bar says is reading, and which screens their roles open.
import { may, productionsWhere } from "@/lib/auth/authorize";
import type { Action } from "@/lib/auth/policy";
import type { Actor } from "@/lib/context";
import { listProductions } from "@/lib/productions/list";
import { load, requireActor } from "./load";
import type { ShellActor } from "./shell";

const screens: { href: string; label: string; opens: Action[] }[] = [
  { href: "/today", label: "Today", opens: ["shot.see"] },
  { href: "/shots", label: "Shots", opens: ["shot.see"] },
  { href: "/review", label: "Review", opens: ["review.see"] },
  { href: "/deliveries", label: "Deliveries", opens: ["delivery.see", "door.open"] },
  { href: "/studio", label: "Studio", opens: ["studio.see", "people.see"] },
];

const roleWords = { artist: "artist", advisor: "science advisor", producer: "producer", client: "client" };

const mayAnywhere = (actor: Actor, action: Action) =>
  may(actor, action, null) || productionsWhere(actor, action).length > 0;

/** Their roles in words, each once: "producer", or "artist and science advisor". */
export function sayRoles(actor: Actor): string {
  const held = [...actor.roles.values()].flatMap((role) => (role ? [roleWords[role]] : []));
  const said = [...new Set([...(actor.isOwner ? ["owner"] : []), ...held])];
  return said.length > 1 ? `${said.slice(0, -1).join(", ")} and ${said.at(-1)}` : (said[0] ?? "");
}

/** The screens this person's roles open, in the bar's order. */
export function screensFor(actor: Actor): ShellActor["items"] {
  return screens
    .filter(({ opens }) => opens.some((action) => mayAnywhere(actor, action)))
    .map(({ href, label }) => ({ href, label }));
}

/** The signed-in reader, or the way to the sign-in page. The production is named when there is but one. */
export async function readShellActor(): Promise<ShellActor> {
  const actor = await requireActor();
  const productions = await load(listProductions, undefined);
  return {
    person: actor.name,
    role: sayRoles(actor),
    items: screensFor(actor),
    ...(productions.length === 1 ? { production: productions[0]!.name } : {}),
  };
}
