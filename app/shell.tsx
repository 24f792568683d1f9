import type { ReactNode } from "react";
import { RoomChoice } from "@/components/topbar/room-choice";
import { SkipLink } from "@/components/topbar/skip-link";
import { chooseRoom } from "./choose-room";
import { CurrentTopbar } from "./current-topbar";
import { readRoom, type Room } from "./room";

export interface ShellActor {
  person: string;
  role?: string;
  production?: string;
  /** The screens this person's roles allow, in order. */
  items: { href: string; label: string }[];
}

export interface ShellProps {
  native: Room;
  /** Who reads; absent before sign-in. */
  actor?: ShellActor | undefined;
  /** The way out, a form or a link, for those who are in. */
  signOut?: ReactNode;
  children: ReactNode;
}

/** A page's room: the bar, the way past it, and the one main part that pages fill. */
export async function Shell({ native, actor, signOut, children }: ShellProps) {
  const room = await readRoom(native);
  return (
    <div data-room={room} className="flex min-h-dvh flex-col">
      <SkipLink />
      <CurrentTopbar
        items={actor?.items ?? []}
        production={actor?.production}
        person={actor?.person}
        role={actor?.role}
      >
        <RoomChoice native={native} room={room} onChoose={chooseRoom} />
        {signOut}
      </CurrentTopbar>
      <main id="content" tabIndex={-1} className="flex-1 outline-none">
        {children}
      </main>
    </div>
  );
}
