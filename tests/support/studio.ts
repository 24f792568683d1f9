// A small studio in a fresh database: one person for each role, a second production with strangers, one shot.
import { randomUUID } from "node:crypto";
import { eq } from "drizzle-orm";
import { openDatabase, type Database } from "@/db/client";
import type { Role } from "@/db/enums";
import { memberships, people } from "@/db/schema/people";
import { productions } from "@/db/schema/productions";
import { setups } from "@/db/schema/shots";
import { loadActor } from "@/lib/auth/load-actor";
import type { Ctx } from "@/lib/context";
import { createSequence } from "@/lib/shots/create-sequence";
import { createShot } from "@/lib/shots/create-shot";
import { defaultSetup, type Setup } from "@/render/scene/setup";
import { freshDatabase } from "./database";

type Who = Role | "owner" | "stranger" | "secondArtist";

export interface Studio {
  db: Database;
  url: string;
  production: string;
  sequence: string;
  shot: string;
  /** A context for each person, as a request of theirs would have it. */
  as: Record<Who, Ctx>;
  /** Their ids. */
  ids: Record<Who, string>;
  close(): Promise<void>;
}

/** Small enough to be rendered within a second. */
export const smallSetup: Setup = {
  ...defaultSetup,
  time: { ...defaultSetup.time, last: 1002 },
  picture: { width: 32, height: 18, exposureStops: 0 },
};

export async function openStudio(setup: Setup = smallSetup): Promise<Studio> {
  const { url, drop } = await freshDatabase();
  const db = openDatabase(url);
  const [here, elsewhere] = await db
    .insert(productions)
    .values([
      { code: "AB", name: "The Lantern Reef", kind: "film" },
      { code: "CD", name: "Another Tide", kind: "film" },
    ])
    .returning();
  const roles: [Who, Role | null, string][] = [
    ["artist", "artist", here!.id],
    ["secondArtist", "artist", here!.id],
    ["advisor", "advisor", here!.id],
    ["producer", "producer", here!.id],
    ["client", "client", here!.id],
    ["stranger", "producer", elsewhere!.id],
    ["owner", null, here!.id],
  ];
  const ids = {} as Record<Who, string>;
  for (const [who, role, productionId] of roles) ids[who] = await addPerson(db, who, role, productionId);
  const as = {} as Record<Who, Ctx>;
  for (const [who] of roles) as[who] = await contextOf(db, ids[who]);

  const { id: sequence } = await createSequence(as.producer, { production: here!.id, name: "Approach" });
  const shot = await addShot(
    as.producer,
    { production: here!.id, sequence, artist: ids.artist },
    "AB-010",
    setup,
  );
  return {
    db,
    url,
    production: here!.id,
    sequence,
    shot,
    as,
    ids,
    close: async () => {
      await db.$client.end();
      await drop();
    },
  };
}

async function addPerson(
  db: Database,
  who: string,
  role: Role | null,
  productionId: string,
): Promise<string> {
  const [person] = await db
    .insert(people)
    .values({
      email: `${who}@ringwright.example`.toLowerCase(),
      name: `${who[0]!.toUpperCase()}${who.slice(1)} Person`,
      passwordHash: "none",
      timeZone: "UTC",
      isOwner: who === "owner",
    })
    .returning();
  if (role) await db.insert(memberships).values({ productionId, personId: person!.id, role });
  return person!.id;
}

export async function contextOf(db: Database, personId: string): Promise<Ctx> {
  const actor = await loadActor(db, personId);
  if (!actor) throw new Error(`Person ${personId} is not there.`);
  return { db, actor, requestId: randomUUID() };
}

/** Adds a shot with the given setup already saved. */
export async function addShot(
  producer: Ctx,
  place: { production: string; sequence: string; artist: string | null },
  code: string,
  setup: Setup = smallSetup,
): Promise<string> {
  const { id } = await createShot(producer, {
    ...place,
    code,
    brief: "A dark with a rim of light.",
    dueOn: null,
  });
  await producer.db.update(setups).set({ body: setup }).where(eq(setups.shotId, id));
  return id;
}
