import { asc, eq } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { events } from "@/db/schema/events";
import { shots } from "@/db/schema/shots";
import { changeShots } from "@/lib/shots/change-shots";
import { createSequence } from "@/lib/shots/create-sequence";
import { createShot } from "@/lib/shots/create-shot";
import { changeShotsInput, createShotInput } from "@/lib/shots/schema";
import { addShot, openStudio, type Studio } from "../../support/studio";

let studio: Studio;
beforeAll(async () => void (studio = await openStudio()));
afterAll(() => studio.close());

const newShot = (code: string) => ({
  production: studio.production,
  sequence: studio.sequence,
  code,
  brief: "A rim of light.",
  dueOn: "2031-10-20",
  artist: studio.ids.artist,
});

describe("adding a sequence", () => {
  it("numbers sequences one after the other, even when two are added at once", async () => {
    const add = (name: string) => createSequence(studio.as.producer, { production: studio.production, name });
    const made = await Promise.all([add("The rim"), add("The lee")]);
    expect(made.map(({ number }) => number).sort()).toEqual([2, 3]);
  });

  it("is refused to an artist, and unknown to another production", async () => {
    const input = { production: studio.production, name: "Coda" };
    await expect(createSequence(studio.as.artist, input)).rejects.toMatchObject({ code: "forbidden" });
    await expect(createSequence(studio.as.stranger, input)).rejects.toMatchObject({ code: "not-found" });
  });
});

describe("adding a shot", () => {
  it("makes the shot with a setup to begin from, and a line in the log", async () => {
    const { id } = await createShot(studio.as.producer, newShot("AB-100"));
    const [shot] = await studio.db.select().from(shots).where(eq(shots.id, id));
    expect(shot).toMatchObject({ code: "AB-100", dueOn: "2031-10-20", hold: "none" });
    const kinds = await studio.db.select({ kind: events.kind, subject: events.subject }).from(events);
    expect(kinds.filter(({ subject }) => subject.shotId === id).map(({ kind }) => kind)).toEqual([
      "shot.made",
    ]);
  });

  it("refuses a code that is taken, saying so beside the code, also when two add it at once", async () => {
    const both = await Promise.allSettled(
      [1, 2].map(() => createShot(studio.as.producer, newShot("AB-110"))),
    );
    expect(both.map(({ status }) => status).sort()).toEqual(["fulfilled", "rejected"]);
    const refused = both.find((one) => one.status === "rejected");
    expect(refused?.reason).toMatchObject({ code: "conflict", field: "code" });
  });

  it("refuses a sequence of another production and a holder who is no artist of this one", async () => {
    const there = await createSequence(studio.as.stranger, {
      production: [...studio.as.stranger.actor.roles.keys()][0]!,
      name: "Elsewhere",
    });
    const make = (change: object) => createShot(studio.as.producer, { ...newShot("AB-120"), ...change });
    await expect(make({ sequence: there.id })).rejects.toMatchObject({ code: "invalid", field: "sequence" });
    await expect(make({ artist: studio.ids.advisor })).rejects.toMatchObject({
      code: "invalid",
      field: "artist",
    });
  });

  it("is refused to an artist and a client, and unknown to another production", async () => {
    const refusals = { artist: "forbidden", client: "not-found", stranger: "not-found" } as const;
    for (const [who, code] of Object.entries(refusals))
      await expect(
        createShot(studio.as[who as keyof typeof refusals], newShot("AB-130")),
      ).rejects.toMatchObject({
        code,
      });
  });

  it("takes only codes in the trade's form and dates that exist", () => {
    const faults = (change: object) =>
      createShotInput.safeParse({ ...newShot("AB-140"), ...change }).error?.issues;
    expect(faults({})).toBeUndefined();
    expect(faults({ code: "AB 140" })?.[0]?.path).toEqual(["code"]);
    expect(faults({ dueOn: "2031-02-30" })?.[0]?.path).toEqual(["dueOn"]);
    expect(faults({ brief: " " })?.[0]?.path).toEqual(["brief"]);
  });
});

describe("changing shots", () => {
  const place = () => ({ production: studio.production, sequence: studio.sequence, artist: null });

  it("changes one thing of several shots at once, each with its line in the log", async () => {
    const ids = [
      await addShot(studio.as.producer, place(), "AB-200"),
      await addShot(studio.as.producer, place(), "AB-210"),
    ];
    const change = { what: "due", dueOn: "2031-11-07" } as const;
    expect(await changeShots(studio.as.producer, { shots: ids, change })).toEqual({ changed: 2 });
    const lines = await studio.db
      .select()
      .from(events)
      .where(eq(events.kind, "shot.changed"))
      .orderBy(asc(events.seq));
    expect(lines.map(({ subject }) => [subject.shot, subject.what])).toEqual([
      ["AB-200", "the due date"],
      ["AB-210", "the due date"],
    ]);
  });

  it("gives a shot to an artist of the production and to nobody else", async () => {
    const id = await addShot(studio.as.producer, place(), "AB-220");
    const give = (artist: string) =>
      changeShots(studio.as.producer, { shots: [id], change: { what: "artist", artist } });
    await expect(give(studio.ids.stranger)).rejects.toMatchObject({ code: "invalid", field: "artist" });
    expect(await give(studio.ids.secondArtist)).toEqual({ changed: 1 });
  });

  it("tells the second of two people who hold the same shot at once that it is held already", async () => {
    const id = await addShot(studio.as.producer, place(), "AB-230");
    const hold = () =>
      changeShots(studio.as.producer, { shots: [id], change: { what: "hold", hold: "on hold" } });
    const both = await Promise.allSettled([hold(), hold()]);
    expect(both.filter(({ status }) => status === "fulfilled")).toHaveLength(1);
    expect(both.find((one) => one.status === "rejected")?.reason).toMatchObject({
      code: "conflict",
      message: expect.stringContaining("on hold already"),
    });
  });

  it("changes nothing when one of the shots is another production's", async () => {
    const id = await addShot(studio.as.producer, place(), "AB-240");
    const there = [...studio.as.stranger.actor.roles.keys()][0]!;
    const sequence = await createSequence(studio.as.stranger, { production: there, name: "Ebb" });
    const foreign = await addShot(
      studio.as.stranger,
      { production: there, sequence: sequence.id, artist: null },
      "CD-010",
    );
    const change = { what: "hold", hold: "omitted" } as const;
    await expect(changeShots(studio.as.producer, { shots: [id, foreign], change })).rejects.toMatchObject({
      code: "not-found",
    });
    const [kept] = await studio.db.select().from(shots).where(eq(shots.id, id));
    expect(kept?.hold).toBe("none");
  });

  it("is refused to an artist, and unknown to a client", async () => {
    const input = { shots: [studio.shot], change: { what: "hold", hold: "omitted" } } as const;
    const asked = changeShotsInput.parse(input);
    await expect(changeShots(studio.as.artist, asked)).rejects.toMatchObject({ code: "forbidden" });
    await expect(changeShots(studio.as.client, asked)).rejects.toMatchObject({ code: "not-found" });
  });
});
