"use server";

import { cookies } from "next/headers";
import { parseSwapped, roomCookie, rooms } from "./room";

const oneYear = 365 * 24 * 60 * 60;

/** Turns pages of one kind to the other room, and back. A matter of one browser: no actor, no event. */
export async function chooseRoom(form: FormData): Promise<void> {
  const native = rooms.find((room) => room === form.get("native"));
  if (!native) return;
  const jar = await cookies();
  const swapped = parseSwapped(jar.get(roomCookie)?.value);
  const next = swapped.includes(native) ? swapped.filter((room) => room !== native) : [...swapped, native];
  jar.set(roomCookie, next.join("."), { path: "/", maxAge: oneYear, httpOnly: true, sameSite: "lax" });
}
