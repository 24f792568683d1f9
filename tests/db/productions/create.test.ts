import { eq } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { events } from "@/db/schema/events";
import { createOwner } from "@/lib/people/create-person";
import { createProduction } from "@/lib/productions/create";
import { listProductions } from "@/lib/productions/list";
import { goodPassword } from "../../support/links";
import { codeOf, refusalOf } from "../../support/refusals";
import { contextOf, openStudio, type Studio } from "../../support/studio";

let studio: Studio;
beforeAll(async () => void (studio = await openStudio()));
afterAll(() => studio.close());

const tide = { code: "NT", name: "The Ninth Tide", kind: "dome" as const };

describe("a production", () => {
  it("is begun by the owner, who is in it at once, and is the first line of its own log", async () => {
    const { id } = await createProduction(studio.as.owner, tide);
    const seen = await listProductions(await contextOf(studio.db, studio.ids.owner));
    expect(seen.find((production) => production.id === id)).toEqual({ id, ...tide, role: null });
    const logged = await studio.db.select().from(events).where(eq(events.productionId, id));
    expect(logged.map(({ kind, seq }) => [kind, seq])).toEqual([["production.made", 1]]);
  });

  it("is begun by nobody else", async () => {
    for (const who of ["producer", "artist", "advisor", "client"] as const)
      expect(await codeOf(createProduction(studio.as[who], { ...tide, code: "ZZ" })), who).toBe("forbidden");
  });

  it("has a code no other has, even when two are begun at once", async () => {
    const both = await Promise.all(
      [1, 2].map(() => refusalOf(createProduction(studio.as.owner, { ...tide, code: "RC" }))),
    );
    const refused = both.filter(({ code }) => code !== "nothing was refused");
    expect(refused).toEqual([
      { code: "conflict", field: "code", message: "The code RC is another production's. Choose another." },
    ]);
  });

  it("is listed to its members with their role there, and to its clients not at all", async () => {
    expect((await listProductions(studio.as.artist)).map(({ code, role }) => [code, role])).toEqual([
      ["AB", "artist"],
    ]);
    expect(await listProductions(studio.as.client)).toEqual([]);
  });
});

describe("the studio's owner", () => {
  it("is one person", async () => {
    const second = {
      email: "second@ringwright.example",
      name: "S",
      password: goodPassword,
      timeZone: "UTC",
      studio: "S",
    };
    expect(await codeOf(studio.db.transaction((tx) => createOwner(tx, second)))).toBe("conflict");
  });
});
