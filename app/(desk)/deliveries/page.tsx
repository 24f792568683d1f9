import type { Metadata } from "next";
import { load, requireActor } from "@/app/load";
import { DeliveriesPage } from "@/components/deliveries/deliveries-page";
import { productionsWhere } from "@/lib/auth/authorize";
import { listDeliveries } from "@/lib/deliveries/list-deliveries";
import { listDoors } from "@/lib/deliveries/list-doors";
import { listProductions } from "@/lib/productions/list";

export const metadata: Metadata = { title: "Deliveries" };

export default async function Page() {
  const actor = await requireActor();
  const isMember = actor.isOwner || productionsWhere(actor, "delivery.see").length > 0;
  const [lines, doors, productions] = await Promise.all([
    isMember ? load(listDeliveries, undefined) : null,
    load(listDoors, undefined),
    load(listProductions, undefined),
  ]);
  const scope = productionsWhere(actor, "delivery.make");
  const assembles = productions.filter(({ id }) => scope.includes(id));
  return <DeliveriesPage {...{ lines, doors, assembles }} timeZone={actor.timeZone} />;
}
