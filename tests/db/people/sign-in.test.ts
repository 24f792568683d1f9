import { eq } from "drizzle-orm";
import { afterAll, beforeAll, beforeEach, describe, expect, it } from "vitest";
import { people, rateLimits } from "@/db/schema/people";
import { loadActor } from "@/lib/auth/load-actor";
import { checkCredentials } from "@/lib/people/check-credentials";
import { closeAccount } from "@/lib/people/close-account";
import { removePerson } from "@/lib/people/remove";
import { addAccount, goodPassword, prepareEnvironment } from "../../support/links";
import { codeOf, refusalOf } from "../../support/refusals";
import { openStudio, type Studio } from "../../support/studio";

let studio: Studio;
let email: string;
let id: string;
let count = 0;
beforeAll(async () => {
  studio = await openStudio();
  prepareEnvironment(studio.url);
});
beforeEach(async () => {
  await studio.db.delete(rateLimits);
  email = `person${(count += 1)}@ringwright.example`;
  ({ id } = await addAccount(studio.db, email));
});
afterAll(() => studio.close());

const attempt = (password: string, from = "203.0.113.1", address = email) =>
  checkCredentials(studio.db, { email: address, password, from });

describe("signing in", () => {
  it("knows the person by e-mail and password, and says under which epoch", async () => {
    expect(await attempt(goodPassword)).toEqual({ id, name: "Odo Ferrand", email, epoch: 1 });
  });

  it("answers a wrong password, an unknown address and a closed account alike", async () => {
    expect(await attempt("wrong")).toBeNull();
    expect(await attempt("wrong", "203.0.113.1", "nobody@ringwright.example")).toBeNull();
    await closeAccount(studio.as.owner, { person: id });
    expect(await attempt(goodPassword)).toBeNull();
  });

  it("refuses the sixth wrong try for an address from one machine, right or wrong, and says how long to wait", async () => {
    for (let tries = 0; tries < 5; tries += 1) expect(await attempt("wrong")).toBeNull();
    expect(await refusalOf(attempt(goodPassword))).toMatchObject({
      code: "too-many",
      message: "Too many tries. Wait 15 minutes, then try again.",
    });
    expect(await attempt(goodPassword, "203.0.113.2")).toMatchObject({ id });
  });

  it("counts tries made at the same moment one by one", async () => {
    const codes = await Promise.all(Array.from({ length: 8 }, () => codeOf(attempt("wrong"))));
    expect(codes.filter((code) => code === "too-many")).toHaveLength(3);
  });

  it("forgets the wrong tries after a right one", async () => {
    for (let round = 0; round < 3; round += 1) {
      for (let tries = 0; tries < 4; tries += 1) expect(await attempt("wrong")).toBeNull();
      expect(await attempt(goodPassword)).toMatchObject({ id });
    }
  });

  it("refuses the 51st wrong try from one machine, for whatever addresses", async () => {
    for (let tries = 0; tries < 50; tries += 1)
      expect(await attempt("wrong", "198.51.100.1", `guess${tries}@ringwright.example`)).toBeNull();
    expect(await codeOf(attempt(goodPassword, "198.51.100.1"))).toBe("too-many");
  });

  it("keeps no e-mail address in the table of tries", async () => {
    await attempt("wrong");
    const rows = await studio.db.select().from(rateLimits);
    expect(rows.length).toBeGreaterThan(0);
    expect(JSON.stringify(rows)).not.toContain(email);
  });
});

describe("someone who leaves", () => {
  it("is no actor any longer with their next request", async () => {
    expect(await loadActor(studio.db, id, 1)).toMatchObject({ id });
    await closeAccount(studio.as.owner, { person: id });
    expect(await loadActor(studio.db, id, 1)).toBeNull();
    expect(await codeOf(closeAccount(studio.as.owner, { person: id }))).toBe("not-found");
  });

  it("loses the production they are taken out of, and keeps their account", async () => {
    await removePerson(studio.as.producer, {
      production: studio.production,
      person: studio.ids.secondArtist,
    });
    const actor = await loadActor(studio.db, studio.ids.secondArtist);
    expect(actor?.roles.size).toBe(0);
    const again = { production: studio.production, person: studio.ids.secondArtist };
    expect(await codeOf(removePerson(studio.as.producer, again))).toBe("not-found");
  });

  it("can be sent away by those alone whom the policy names", async () => {
    const wish = { production: studio.production, person: studio.ids.advisor };
    expect(await codeOf(removePerson(studio.as.artist, wish))).toBe("forbidden");
    expect(await codeOf(removePerson(studio.as.stranger, wish))).toBe("not-found");
    expect(await codeOf(closeAccount(studio.as.producer, { person: id }))).toBe("forbidden");
    expect(await codeOf(closeAccount(studio.as.owner, { person: studio.ids.owner }))).toBe("conflict");
  });

  it("has an epoch raised, so that a reopened account does not revive old sessions", async () => {
    await closeAccount(studio.as.owner, { person: id });
    await studio.db.update(people).set({ leftAt: null }).where(eq(people.id, id));
    expect(await loadActor(studio.db, id, 1)).toBeNull();
    expect(await loadActor(studio.db, id, 2)).toMatchObject({ id });
  });
});
