import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { load, requireActor } from "@/app/load";
import { LogPage } from "@/components/studio/log-page";
import { listLogs } from "@/lib/events/choose-log";
import { readLog } from "@/lib/events/read-log";
import { readLogInput } from "@/lib/events/schema";
import { placesOf } from "../places";

export const metadata: Metadata = { title: "Event log" };

type Search = Promise<Record<string, string | string[] | undefined>>;

export default async function StudioLogPage({ searchParams }: { searchParams: Search }) {
  const actor = await requireActor();
  const { production = (await load(listLogs, {}))[0]?.id, before } = await searchParams;
  const wanted = readLogInput.safeParse({ production, before });
  if (!wanted.success) notFound();
  const page = await load(readLog, wanted.data);
  return <LogPage {...page} places={placesOf(actor, "/studio/log")} />;
}
