import { eq, like } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { events, outbox } from "@/db/schema/events";
import { listQueue } from "@/lib/reviews/list-queue";
import { sendForReview } from "@/lib/reviews/send-for-review";
import { judge, openDeliveringStudio, sentVersion, wholeVersion } from "../../support/delivery-life";
import { beginVersion } from "../../support/frames";
import { codeOf, refusalOf } from "../../support/refusals";
import { addShot, type Studio } from "../../support/studio";

let studio: Studio;
beforeAll(async () => {
  studio = await openDeliveringStudio();
});
afterAll(() => studio.close());

const words = "Is the bright edge the first image?";
const newShot = (code: string) =>
  addShot(
    studio.as.producer,
    { production: studio.production, sequence: studio.sequence, artist: studio.ids.artist },
    code,
  );

describe("sending a version for review", () => {
  it("puts a whole version into the advisor's queue, the log and a letter", async () => {
    const version = await wholeVersion(studio);
    await sendForReview(studio.as.artist, { version, words });
    const { items } = await listQueue(studio.as.advisor);
    expect(items).toMatchObject([
      { id: version, words, yours: true, shotCode: "AB-010", first: 1001, last: 1002 },
    ]);
    const [event] = await studio.db.select().from(events).where(eq(events.kind, "review.sent"));
    expect(event!.subject).toMatchObject({ versionId: version, shot: "AB-010", by: "Artist Person" });
    const letters = await studio.db
      .select()
      .from(outbox)
      .where(like(outbox.key, `mail review.sent ${version}%`));
    expect(letters.map(({ payload }) => payload)).toMatchObject([
      { to: "advisor@ringwright.example", action: { path: `/versions/${version}` } },
    ]);
  });

  it("shows the queue to members as not theirs to judge, and to clients and strangers as empty", async () => {
    expect((await listQueue(studio.as.artist)).items).toMatchObject([{ yours: false }]);
    expect((await listQueue(studio.as.client)).items).toEqual([]);
    expect((await listQueue(studio.as.stranger)).items).toEqual([]);
  });

  it("is refused to every other role, and to other productions there is no such version", async () => {
    const version = await wholeVersion(studio, await newShot("AB-020"));
    for (const who of ["advisor", "producer", "owner"] as const)
      expect(await codeOf(sendForReview(studio.as[who], { version, words }))).toBe("forbidden");
    for (const who of ["client", "stranger"] as const)
      expect(await codeOf(sendForReview(studio.as[who], { version, words }))).toBe("not-found");
  });

  it("is refused while frames are missing, and for a version that a newer one has replaced", async () => {
    const shot = await newShot("AB-030");
    const older = await wholeVersion(studio, shot);
    const newer = await beginVersion(studio.as.artist, shot);
    expect(await refusalOf(sendForReview(studio.as.artist, { version: newer.id, words }))).toMatchObject({
      code: "conflict",
      message: expect.stringContaining("not all rendered"),
    });
    expect(await refusalOf(sendForReview(studio.as.artist, { version: older, words }))).toMatchObject({
      code: "conflict",
      message: expect.stringContaining("Version 2"),
    });
  });

  it("happens once when two artists send the same version at the same moment", async () => {
    const version = await wholeVersion(studio, await newShot("AB-040"));
    const both = [studio.as.artist, studio.as.secondArtist].map((who) =>
      codeOf(sendForReview(who, { version, words })),
    );
    expect((await Promise.all(both)).sort()).toEqual(["conflict", "nothing was refused"]);
  });

  it("leaves the queue once every frame is signed, or some are returned", async () => {
    const signed = await sentVersion(studio, await newShot("AB-050"));
    const returned = await sentVersion(studio, await newShot("AB-060"));
    await judge(studio, signed, "signed off", { first: 1001, last: 1001 });
    const waiting = async () => (await listQueue(studio.as.advisor)).items.map(({ id }) => id);
    expect(await waiting()).toContain(signed);
    await judge(studio, signed, "signed off", { first: 1002, last: 1002 });
    await judge(studio, returned, "returned", { first: 1002, last: 1002 });
    expect(await waiting()).not.toContain(signed);
    expect(await waiting()).not.toContain(returned);
  });
});
