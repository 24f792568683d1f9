import type { Metadata } from "next";
import { load, requireActor } from "@/app/load";
import { MailPage } from "@/components/studio/mail-page";
import { readLocalMail } from "@/lib/mail/read-local";
import { placesOf } from "../places";

export const metadata: Metadata = { title: "Local mail" };

type Search = Promise<{ letter?: string | string[] }>;

export default async function StudioMailPage({ searchParams }: { searchParams: Search }) {
  const actor = await requireActor();
  const { letters, total } = await load(readLocalMail, {});
  const { letter } = await searchParams;
  const open = letters.find(({ id }) => id === letter) ?? letters[0];
  const places = placesOf(actor, "/studio/mail");
  return <MailPage letters={letters} total={total} open={open} timeZone={actor.timeZone} places={places} />;
}
