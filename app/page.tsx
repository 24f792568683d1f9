import { redirect } from "next/navigation";
import { productionsWhere } from "@/lib/auth/authorize";
import { requireActor } from "./load";

/** The studio's people begin with what waits for them; a client, with what was delivered to them. */
export default async function Page() {
  const actor = await requireActor();
  redirect(productionsWhere(actor, "shot.see").length > 0 || actor.isOwner ? "/today" : "/deliveries");
}
