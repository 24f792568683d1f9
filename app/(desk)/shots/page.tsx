import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { load } from "@/app/load";
import { ShotsPage } from "@/components/shots/shots-page";
import { listShots } from "@/lib/shots/list-shots";
import { listShotsInput } from "@/lib/shots/schema";

export const metadata: Metadata = { title: "Shots" };

type Search = Promise<Record<string, string | string[] | undefined>>;

export default async function Page({ searchParams }: { searchParams: Search }) {
  const wanted = listShotsInput.safeParse(await searchParams);
  if (!wanted.success) notFound();
  return <ShotsPage list={await load(listShots, wanted.data)} />;
}
