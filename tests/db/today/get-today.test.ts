import { eq } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { shots } from "@/db/schema/shots";
import { makeDelivery } from "@/lib/deliveries/make-delivery";
import { publishDelivery } from "@/lib/deliveries/publish-delivery";
import { signReceipt } from "@/lib/deliveries/sign-receipt";
import { getDoor } from "@/lib/deliveries/get-door";
import { startDownload } from "@/lib/deliveries/start-download";
import { getDeclaration } from "@/lib/reviews/get-declaration";
import { withdrawVerdict } from "@/lib/reviews/withdraw-verdict";
import { getToday } from "@/lib/today/get-today";
import { choose, judge, openDeliveringStudio, sentVersion, wholeVersion } from "../../support/delivery-life";
import { addShot, type Studio } from "../../support/studio";

let studio: Studio;
let version: string;
let delivery: string;
beforeAll(async () => {
  studio = await openDeliveringStudio();
});
afterAll(() => studio.close());

const waiting = async (who: keyof Studio["as"]) =>
  (await getToday(studio.as[who])).items.map(
    ({ sentence: { before, name, after } }) => before + name + after,
  );

describe("what waits, as one shot goes its way", () => {
  it("waits for the artist who has it while it has no version, and for nobody else", async () => {
    expect(await waiting("artist")).toEqual(["AB-010 waits for its first version."]);
    for (const who of ["secondArtist", "advisor", "producer", "client", "owner", "stranger"] as const)
      expect(await waiting(who)).toEqual([]);
  });

  it("waits for the artist again when it is whole, with a reading time that follows from its frames", async () => {
    version = await wholeVersion(studio);
    const { items } = await getToday(studio.as.artist);
    expect(items).toMatchObject([{ sentence: { after: " is whole, and not sent yet." }, minutes: 11 }]);
  });

  it("waits for the advisor once a version is sent, on the day it was sent", async () => {
    version = await sentVersion(studio);
    const { items, today } = await getToday(studio.as.advisor);
    expect(items).toMatchObject([
      { sentence: { name: "AB-010" }, sentOn: today, act: { href: `/versions/${version}` } },
    ]);
    expect(items[0]!.sentence.after).toMatch(/^ has waited since \d\d:\d\d for your verdict\.$/);
    expect(await waiting("artist")).toEqual([]);
  });

  it("waits for the artist with the advisor's words when it is returned", async () => {
    await judge(studio, version, "returned");
    const { items } = await getToday(studio.as.artist);
    expect(items).toMatchObject([
      { sentence: { after: " was returned." }, detail: expect.stringContaining("far rim") },
    ]);
    expect(await waiting("advisor")).toEqual([]);
  });

  it("waits for the producer when it is signed off, then made, then to be published", async () => {
    const { verdict } = await judge(studio, version, "signed off");
    expect(await waiting("producer")).toEqual(["Version 2 of AB-010 is signed off, and in no delivery yet."]);
    ({ delivery } = await makeDelivery(studio.as.producer, choose(studio, [{ version, verdict }])));
    expect(await waiting("producer")).toEqual([
      "Delivery 1, First light, is made, and published to nobody yet.",
    ]);
    expect(await waiting("client")).toEqual([]);
  });

  it("waits for the client once it is published, until its receipt is signed", async () => {
    await publishDelivery(studio.as.producer, { delivery, recipients: [studio.ids.client], days: 7 });
    expect(await waiting("producer")).toEqual([]);
    expect(await waiting("client")).toEqual(["Delivery 1, First light, is ready to be taken."]);
    await startDownload(studio.as.client, { delivery, what: "everything" });
    const { manifestDigest } = await getDoor(studio.as.client, { delivery });
    await signReceipt(studio.as.client, { delivery, manifestDigest, kind: "received", words: "" });
    expect(await waiting("client")).toEqual([]);
  });

  it("waits for the producer and the advisor again when the verdict is withdrawn", async () => {
    const { after } = await getDeclaration(studio.as.advisor, { version });
    await withdrawVerdict(studio.as.advisor, { version, words: "The edge.", after });
    expect(await waiting("producer")).toEqual(["Delivery 1, First light, is stopped."]);
    const { items } = await getToday(studio.as.advisor);
    expect(items[0]!.detail).toMatch(/Its sign-off was withdrawn/);
  });
});

describe("what else the page says", () => {
  it("names a shot that is late to its producer, and what happened to members only", async () => {
    const place = { production: studio.production, sequence: studio.sequence, artist: studio.ids.artist };
    const shot = await addShot(studio.as.producer, place, "AB-020");
    await studio.db.update(shots).set({ dueOn: "2020-01-01" }).where(eq(shots.id, shot));
    const [first] = (await getToday(studio.as.producer)).items;
    expect(first).toMatchObject({
      sentence: { name: "AB-020", after: " is late, and open." },
      dueOn: "2020-01-01",
    });
    expect((await getToday(studio.as.producer)).events[0]!.sentence).toContain("AB-020");
    expect(await getToday(studio.as.client)).toMatchObject({ events: [], seesLog: false });
  });
});
