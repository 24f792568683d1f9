import type { ReactNode } from "react";
import { SignOut } from "@/components/sign-in/sign-out";
import { RoomChoice } from "@/components/topbar/room-choice";
import { SkipLink } from "@/components/topbar/skip-link";
import { productionsWhere } from "@/lib/auth/authorize";
import { chooseRoom } from "../choose-room";
import { requireActor } from "../load";
import { readRoom } from "../room";
import { Shell } from "../shell";
import { readShellActor } from "../shell-actor";

/** A client's door has no navigation: what they came for stands at the top, the way out at the foot. Members keep the bar. */
export default async function DoorLayout({ children }: { children: ReactNode }) {
  const actor = await requireActor();
  if (actor.isOwner || productionsWhere(actor, "delivery.see").length > 0)
    return (
      <Shell native="desk" actor={await readShellActor()} signOut={<SignOut />}>
        {children}
      </Shell>
    );
  const room = await readRoom("desk");
  return (
    <div data-room={room} className="flex min-h-dvh flex-col">
      <SkipLink />
      <main id="content" tabIndex={-1} className="flex-1 outline-none">
        {children}
      </main>
      <footer className="type-label flex flex-wrap items-center justify-end gap-16 px-16 pb-24 text-soft sm:px-72">
        <RoomChoice native="desk" room={room} onChoose={chooseRoom} />
        <SignOut />
      </footer>
    </div>
  );
}
