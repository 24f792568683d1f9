import type { Actor } from "../context";
import { getServerSession } from "next-auth";
import { database } from "../database";
import { loadActor } from "./load-actor";
import { authOptions } from "./options";

/** The signed-in person as the database knows them at this moment; null when there is none. */
export async function currentActor(): Promise<Actor | null> {
  const session = await getServerSession(authOptions());
  if (!session?.personId) return null;
  return loadActor(database(), session.personId, session.epoch);
}
