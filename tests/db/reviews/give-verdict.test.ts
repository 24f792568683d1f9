import { eq, like } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { events, outbox } from "@/db/schema/events";
import { verdicts } from "@/db/schema/reviews";
import { memberships } from "@/db/schema/people";
import { getDeclaration } from "@/lib/reviews/get-declaration";
import { giveVerdict } from "@/lib/reviews/give-verdict";
import { giveVerdictSchema } from "@/lib/reviews/schema";
import {
  addMember,
  judge,
  openDeliveringStudio,
  sentVersion,
  wholeVersion,
} from "../../support/delivery-life";
import { beginVersion } from "../../support/frames";
import { codeOf, databaseRefusal, refusalOf } from "../../support/refusals";
import { addShot, contextOf, type Studio } from "../../support/studio";

let studio: Studio;
beforeAll(async () => {
  studio = await openDeliveringStudio();
});
afterAll(() => studio.close());

let shots = 10;
const newShot = () => {
  const place = { production: studio.production, sequence: studio.sequence, artist: studio.ids.artist };
  return addShot(studio.as.producer, place, `AB-${(shots += 10)}0`);
};
const newSent = async () => sentVersion(studio, await newShot());

describe("the declaration", () => {
  it("shows what would be signed in sentences, with its digest and who will be told", async () => {
    const version = await newSent();
    const shown = await getDeclaration(studio.as.advisor, { version });
    expect(shown).toMatchObject({
      obstacle: null,
      after: null,
      first: 1001,
      last: 1002,
      maker: "Artist Person",
    });
    expect(shown.digest).toMatch(/^[0-9a-f]{64}$/);
    expect(shown.setupFacts[0]).toBe("The hole has the mass of 40 million suns and spin 0.6 of at most 1.");
    expect(shown.told).toEqual(["Artist Person", "Producer Person"]);
  });

  it("says to anyone else why the verdict is not theirs, and to outsiders nothing", async () => {
    const version = await newSent();
    for (const who of ["artist", "producer", "owner"] as const)
      expect((await getDeclaration(studio.as[who], { version })).obstacle).toMatch(
        /Only this production's science advisor/,
      );
    for (const who of ["client", "stranger"] as const)
      expect(await codeOf(getDeclaration(studio.as[who], { version }))).toBe("not-found");
  });
});

describe("giving a verdict", () => {
  it("keeps the whole statement under the digest, in the log, and tells the maker and the producers", async () => {
    const version = await newSent();
    const { verdict, statement } = await judge(studio, version);
    const [row] = await studio.db.select().from(verdicts).where(eq(verdicts.id, verdict));
    const { digest } = await getDeclaration(studio.as.advisor, { version });
    expect(row).toMatchObject({
      kind: "signed off",
      first: 1001,
      last: 1002,
      digest,
      statement,
      givenAs: "advisor",
    });
    expect(statement).toContain(
      `I, Advisor Person, science advisor to The Lantern Reef, have looked at frames 1001 to 1002 of version 1`,
    );
    expect(statement).toContain(`no other bytes than those of the digest ${digest}`);
    expect(statement).toContain("On these frames I declare: signed off.");
    const [event] = await studio.db.select().from(events).where(eq(events.kind, "verdict.signed"));
    expect(event!.subject).toMatchObject({ versionId: version, frames: "frames 1001 to 1002" });
    const letters = await studio.db
      .select()
      .from(outbox)
      .where(like(outbox.key, `mail verdict ${verdict}%`));
    const to = letters.map(({ payload }) => (payload as { to: string }).to);
    expect(to.sort()).toEqual(["artist@ringwright.example", "producer@ringwright.example"]);
  });

  it("is refused to other roles, and to other productions there is no such version", async () => {
    const version = await newSent();
    const give = (who: "artist" | "producer" | "owner" | "client" | "stranger") =>
      codeOf(giveVerdict(studio.as[who], { ...input, version }));
    const input = {
      kind: "returned",
      first: 1001,
      last: 1002,
      words: "No.",
      figures: "00000000",
      after: null,
    } as const;
    for (const who of ["artist", "producer", "owner"] as const) expect(await give(who)).toBe("forbidden");
    for (const who of ["client", "stranger"] as const) expect(await give(who)).toBe("not-found");
  });

  it("needs the last eight figures of this digest, frames the version has, and words when it returns", async () => {
    const version = await newSent();
    const { digest } = await getDeclaration(studio.as.advisor, { version });
    const good = {
      version,
      kind: "signed off",
      first: 1001,
      last: 1002,
      words: "",
      figures: digest!.slice(-8),
      after: null,
    } as const;
    const give = (change: object) => refusalOf(giveVerdict(studio.as.advisor, { ...good, ...change }));
    expect(await give({ figures: "deadbeef" })).toMatchObject({ code: "invalid", field: "figures" });
    expect(await give({ first: 1000 })).toMatchObject({ code: "invalid", field: "first" });
    expect(await give({ last: 1003 })).toMatchObject({ code: "invalid", field: "last" });
    expect(giveVerdictSchema.safeParse({ ...good, kind: "returned" }).error?.issues[0]?.path).toEqual([
      "words",
    ]);
    expect(giveVerdictSchema.safeParse({ ...good, first: 1002, last: 1001 }).error?.issues[0]?.path).toEqual([
      "last",
    ]);
    expect(giveVerdictSchema.parse({ ...good, figures: " ABCD0123 " }).figures).toBe("abcd0123");
  });

  it("is refused before a version is sent, and once a newer one governs", async () => {
    const unsent = await wholeVersion(studio, await newShot());
    expect(await refusalOf(judge(studio, unsent))).toMatchObject({
      code: "conflict",
      message: expect.stringMatching(/sent/),
    });
    const shot = await newShot();
    const older = await sentVersion(studio, shot);
    await beginVersion(studio.as.artist, shot);
    expect(await refusalOf(judge(studio, older))).toMatchObject({
      code: "conflict",
      message: expect.stringMatching(/Version 2 of .* has been made since/),
    });
  });

  it("lets one of two advisors win when both judge at once, and tells the other", async () => {
    const second = await addMember(studio, "Second", "advisor");
    const version = await newSent();
    const both = await Promise.all([
      refusalOf(judge(studio, version, "signed off")),
      refusalOf(judge(studio, version, "returned", { by: second })),
    ]);
    expect(both.map(({ code }) => code).sort()).toEqual(["conflict", "nothing was refused"]);
    expect(both.find(({ code }) => code === "conflict")?.message).toMatch(
      /gave the verdict “.*” while this page was open/,
    );
    const given = await studio.db.select().from(verdicts).where(eq(verdicts.versionId, version));
    expect(given).toHaveLength(1);
  });

  it("stands on a part of the frames, and a later one follows it there", async () => {
    const version = await newSent();
    await judge(studio, version, "signed off", { last: 1001 });
    await judge(studio, version, "returned", { first: 1002 });
    await judge(studio, version, "signed off", { first: 1002 });
    const { runs } = await getDeclaration(studio.as.advisor, { version });
    expect(runs).toMatchObject([
      { kind: "signed off", first: 1001, last: 1001 },
      { kind: "signed off", first: 1002, last: 1002 },
    ]);
    expect(await studio.db.select().from(verdicts).where(eq(verdicts.versionId, version))).toHaveLength(3);
  });

  it("is never given on a version one made oneself, in the code and in the database", async () => {
    const version = await newSent();
    // The artist changes roles: they are the advisor now, of a version that is still theirs.
    await studio.db
      .update(memberships)
      .set({ role: "advisor" })
      .where(eq(memberships.personId, studio.ids.artist));
    const maker = await contextOf(studio.db, studio.ids.artist);
    expect(await refusalOf(judge(studio, version, "signed off", { by: maker }))).toMatchObject({
      code: "forbidden",
      message: expect.stringMatching(/made .* yourself/),
    });
    expect(await databaseRefusal(insertVerdict(version, studio.ids.artist))).toMatch(
      /nobody judges a version they made/,
    );
    await studio.db
      .update(memberships)
      .set({ role: "artist" })
      .where(eq(memberships.personId, studio.ids.artist));
  });

  it("is refused by the database from anyone but the advisor, on other frames, and under another digest", async () => {
    const version = await newSent();
    expect(await databaseRefusal(insertVerdict(version, studio.ids.producer))).toMatch(
      /only the production's advisor/,
    );
    expect(await databaseRefusal(insertVerdict(version, studio.ids.stranger))).toMatch(
      /only the production's advisor/,
    );
    expect(await databaseRefusal(insertVerdict(version, studio.ids.advisor, { last: 1003 }))).toMatch(
      /not all in 1001-1002/,
    );
    expect(
      await databaseRefusal(insertVerdict(version, studio.ids.advisor, { digest: "0".repeat(64) })),
    ).toMatch(/foreign key/);
    expect(await databaseRefusal(insertVerdict(version, studio.ids.advisor, { kind: "withdrawn" }))).toMatch(
      /only frames that are signed off can be withdrawn/,
    );
  });
});

async function insertVerdict(version: string, givenBy: string, change: object = {}) {
  const { digest } = await getDeclaration(studio.as.advisor, { version });
  const row = { versionId: version, digest: digest!, kind: "signed off", first: 1001, last: 1002 } as const;
  return studio.db
    .insert(verdicts)
    .values({ ...row, words: "", statement: "s", givenBy, givenAs: "advisor", ...change });
}
