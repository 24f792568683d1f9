import { and, eq } from "drizzle-orm";
import type { Database } from "@/db/client";
import { events } from "@/db/schema/events";
import { people } from "@/db/schema/people";
import type { Actor } from "../context";
import { recordEvent } from "../events/record";
import { cast } from "./story";

/** Whether the database is empty, holds an unfinished demonstration, a finished one, or somebody's own studio. */
export async function isFinished(db: Database): Promise<"empty" | "begun" | "finished" | "theirs"> {
  const [anyone] = await db.select({ id: people.id }).from(people).limit(1);
  if (!anyone) return "empty";
  const [made] = await db.select({ id: events.id }).from(events).where(eq(events.kind, "demonstration.made"));
  if (made) return "finished";
  const [owner] = await db
    .select({ id: people.id })
    .from(people)
    .where(and(eq(people.email, cast.owner.email), eq(people.isOwner, true)));
  return owner ? "begun" : "theirs";
}

/** The last line of the making, by which the next start knows that nothing is missing. */
export async function markFinished(db: Database, owner: Actor): Promise<void> {
  await db.transaction((tx) =>
    recordEvent(tx, {
      productionId: null,
      actorId: owner.id,
      kind: "demonstration.made",
      subject: { by: owner.name },
    }),
  );
}
