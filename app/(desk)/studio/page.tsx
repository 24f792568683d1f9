import type { Metadata } from "next";
import { load, requireActor } from "@/app/load";
import { LivePage } from "@/components/live/live-page";
import { PeoplePage } from "@/components/studio/people-page";
import { listPeople } from "@/lib/people/list";
import { placesOf } from "./places";

export const metadata: Metadata = { title: "Studio" };

export default async function StudioPeoplePage() {
  const actor = await requireActor();
  const people = await load(listPeople, {});
  return (
    <>
      <LivePage />
      <PeoplePage
        {...people}
        readerId={actor.id}
        timeZone={actor.timeZone}
        places={placesOf(actor, "/studio")}
      />
    </>
  );
}
