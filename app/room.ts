import { cookies } from "next/headers";

export const rooms = ["desk", "viewing"] as const;
export type Room = (typeof rooms)[number];

export const roomCookie = "room";

/** The rooms a reader wants the other way about, as the cookie holds them: "", "desk", "viewing" or "desk.viewing". */
export function parseSwapped(value: string | undefined): Room[] {
  const parts = (value ?? "").split(".");
  return rooms.filter((room) => parts.includes(room));
}

export const otherRoom = (room: Room): Room => (room === "desk" ? "viewing" : "desk");

/** The room to draw a page in: its own, unless the reader chose the other for pages of its kind. */
export async function readRoom(native: Room): Promise<Room> {
  const swapped = parseSwapped((await cookies()).get(roomCookie)?.value);
  return swapped.includes(native) ? otherRoom(native) : native;
}
