import { and, eq, sql } from "drizzle-orm";
import { afterAll, beforeAll, beforeEach, describe, expect, it } from "vitest";
import { deliveries, recipients } from "@/db/schema/deliveries";
import { memberships, people } from "@/db/schema/people";
import type { Change } from "@/lib/events/listen";
import { announce } from "@/lib/events/record";
import { makeSubscriptions } from "@/lib/events/subscriptions";
import { openStudio, type Studio } from "../../support/studio";
import { until } from "../../support/worker";

type Who = keyof Studio["as"];

let studio: Studio;
const heard = new Map<Who, Change[]>();
const ended = new Set<Who>();
const leave: (() => void)[] = [];

beforeAll(async () => {
  studio = await openStudio();
  const { subscribe } = makeSubscriptions(studio.db, studio.url);
  for (const who of ["artist", "producer", "client", "stranger", "owner", "secondArtist"] as const) {
    heard.set(who, []);
    leave.push(
      await subscribe(studio.as[who], {
        send: (change) => heard.get(who)?.push(change),
        end: () => ended.add(who),
      }),
    );
  }
  // Until the listening connection is there, nothing is heard.
  await until(async () => {
    await announce(studio.db, { kind: "ready", productionId: studio.production });
    return heard.get("artist")!.length > 0;
  });
});
beforeEach(async () => {
  await settle();
  for (const changes of heard.values()) changes.length = 0;
});
afterAll(async () => {
  for (const stop of leave) stop();
  await studio.close();
});

let marks = 0;

/** Waits until everything announced before has been passed on: a mark announced after it is heard. */
async function settle(): Promise<void> {
  marks += 1;
  const mark = marks;
  await announce(studio.db, { kind: "mark", productionId: null, mark });
  await until(async () => heard.get("owner")!.some((change) => change.mark === mark));
}

const kinds = (who: Who) =>
  heard
    .get(who)!
    .map(({ kind }) => kind)
    .filter((kind) => kind !== "mark");

describe("who hears of what", () => {
  it("tells members of a production's changes, and nobody of another or of none", async () => {
    await announce(studio.db, { kind: "frame.finished", productionId: studio.production, frame: 1001 });
    await settle();
    for (const who of ["artist", "producer", "owner"] as const)
      expect(kinds(who)).toEqual(["frame.finished"]);
    for (const who of ["client", "stranger"] as const) expect(kinds(who)).toEqual([]);
  });

  it("tells only the owner of what concerns the studio itself", async () => {
    await announce(studio.db, { kind: "studio.made", productionId: null });
    await settle();
    expect(kinds("owner")).toEqual(["studio.made"]);
    expect(kinds("producer")).toEqual([]);
  });

  it("tells a client that something of theirs changed, and not what", async () => {
    const [delivery] = await studio.db
      .insert(deliveries)
      .values({ productionId: studio.production, number: 1, title: "First", madeBy: studio.ids.producer })
      .returning();
    const about = { kind: "delivery.published", productionId: studio.production, deliveryId: delivery!.id };
    await announce(studio.db, about);
    await settle();
    expect(heard.get("client")).toEqual([]);

    const expiresAt = sql`now() + interval '7 days'`;
    await studio.db
      .insert(recipients)
      .values({ deliveryId: delivery!.id, personId: studio.ids.client, expiresAt });
    await announce(studio.db, about);
    await settle();
    expect(heard.get("client")).toEqual([{ kind: "delivery", productionId: null }]);
    expect(kinds("stranger")).toEqual([]);
  });

  it("stops telling someone whose membership ended, and ends the stream of someone who left", async () => {
    await studio.db
      .update(memberships)
      .set({ endedAt: sql`now()` })
      .where(
        and(eq(memberships.personId, studio.ids.producer), eq(memberships.productionId, studio.production)),
      );
    await studio.db
      .update(people)
      .set({ leftAt: sql`now()` })
      .where(eq(people.id, studio.ids.secondArtist));
    await announce(studio.db, { kind: "person.removed", productionId: studio.production });
    await announce(studio.db, { kind: "shot.made", productionId: studio.production });
    await settle();
    expect(kinds("producer")).toEqual([]);
    expect(kinds("artist")).toEqual(["person.removed", "shot.made"]);
    expect([...ended]).toEqual(["secondArtist"]);
  });
});
