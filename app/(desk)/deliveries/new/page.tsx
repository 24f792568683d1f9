import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { load } from "@/app/load";
import { AssemblePage } from "@/components/deliveries/assemble-page";
import { listSigned } from "@/lib/deliveries/list-signed";
import { productionIdSchema } from "@/lib/deliveries/schema";

export const metadata: Metadata = { title: "Assemble a delivery" };

type Search = Promise<Record<string, string | string[] | undefined>>;

export default async function Page({ searchParams }: { searchParams: Search }) {
  const wanted = productionIdSchema.safeParse(await searchParams);
  if (!wanted.success) notFound();
  return <AssemblePage signed={await load(listSigned, wanted.data)} />;
}
