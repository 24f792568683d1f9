import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { load } from "@/app/load";
import { DeliveryPage } from "@/components/deliveries/delivery-page";
import { DoorPage } from "@/components/door/door-page";
import { openDelivery } from "@/lib/deliveries/open-delivery";
import { deliveryIdSchema } from "@/lib/deliveries/schema";

export const metadata: Metadata = { title: "Delivery" };

export default async function Page({ params }: { params: Promise<{ delivery: string }> }) {
  const wanted = deliveryIdSchema.safeParse(await params);
  if (!wanted.success) notFound();
  const opened = await load(openDelivery, wanted.data);
  return opened.as === "member" ? (
    <DeliveryPage delivery={opened.delivery} />
  ) : (
    <DoorPage door={opened.door} />
  );
}
