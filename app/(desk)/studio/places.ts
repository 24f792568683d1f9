import type { StudioPlace } from "@/components/studio/studio-page";
import { may, productionsWhere } from "@/lib/auth/authorize";
import type { Actor } from "@/lib/context";
import { environment } from "@/lib/environment";

/** The parts of the studio this person may see. */
export function placesOf(actor: Actor, here: string): StudioPlace[] {
  const people = may(actor, "studio.see", null) || productionsWhere(actor, "people.see").length > 0;
  const mail = may(actor, "studio.mail", null) && environment().RINGWRIGHT_LOCAL === "1";
  const places = [
    ...(people ? [{ href: "/studio", label: "People and productions" }] : []),
    { href: "/studio/log", label: "Event log" },
    ...(mail ? [{ href: "/studio/mail", label: "Local mail" }] : []),
  ];
  return places.map((place) => ({ ...place, current: place.href === here }));
}
