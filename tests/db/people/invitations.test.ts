import { and, eq, isNull, like, sql } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { events } from "@/db/schema/events";
import { links, memberships } from "@/db/schema/people";
import { joinAsKnown, joinAsNew } from "@/lib/people/accept-invitation";
import { closeAccount } from "@/lib/people/close-account";
import { invitePerson } from "@/lib/people/invite";
import { listPeople } from "@/lib/people/list";
import { openInvitation } from "@/lib/people/open-invitation";
import { revokeInvitation } from "@/lib/people/revoke-invitation";
import { hashToken } from "@/lib/people/token";
import {
  accountOf,
  addAccount,
  goodPassword,
  lettersTo,
  newestToken,
  prepareEnvironment,
} from "../../support/links";
import { codeOf, refusalOf } from "../../support/refusals";
import { contextOf, openStudio, type Studio } from "../../support/studio";

let studio: Studio;
beforeAll(async () => {
  studio = await openStudio();
  prepareEnvironment(studio.url);
});
afterAll(() => studio.close());

let machines = 0;
const open = () => ({ db: studio.db, from: `203.0.113.${(machines += 1)}` });
const address = (name: string) => `${name}@ringwright.example`;

async function invite(name: string, role: "artist" | "advisor" | "producer" | "client" = "artist") {
  const email = address(name);
  const { id } = await invitePerson(studio.as.producer, {
    productionId: studio.production,
    email,
    name,
    role,
  });
  return { id, email, token: await newestToken(studio.db, email) };
}
const answerOf = (token: string) => ({
  token,
  name: "Ilse Marn",
  password: goodPassword,
  timeZone: "Europe/Oslo",
});
const roleIn = async (personId: string) =>
  (
    await studio.db
      .select()
      .from(memberships)
      .where(and(eq(memberships.personId, personId), isNull(memberships.endedAt)))
  ).map(({ role, productionId }) => [role, productionId]);
const kindsSince = async (subject: string) =>
  (
    await studio.db
      .select()
      .from(events)
      .where(like(sql`subject::text`, `%${subject}%`))
      .orderBy(events.id)
  ).map(({ kind }) => kind);

describe("an invitation", () => {
  it("makes an account and a membership, once, and the log says both", async () => {
    const { email, token } = await invite("ilse", "advisor");
    expect(await openInvitation(studio, { token })).toMatchObject({ email, role: "advisor", personId: null });
    await joinAsNew(open(), answerOf(token));
    const account = await accountOf(studio.db, email);
    expect(account).toMatchObject({
      name: "Ilse Marn",
      timeZone: "Europe/Oslo",
      isOwner: false,
      leftAt: null,
    });
    expect(account.passwordHash).toMatch(/^\$argon2id\$/);
    expect(await roleIn(account.id)).toEqual([["advisor", studio.production]]);
    expect(await kindsSince(email)).toEqual(["person.invited"]);
    expect(await kindsSince(account.id)).toEqual(["person.joined"]);
  });

  it("leaves no token in the database, only its hash", async () => {
    const { token } = await invite("secret");
    const tables = ["links", "outbox", "events", "people", "rate_limits"];
    for (const table of tables) {
      const found = await studio.db.execute(
        sql`select 1 from ${sql.identifier(table)} t where t::text like ${`%${token}%`}`,
      );
      expect(found.rows, table).toEqual([]);
    }
    expect(await studio.db.$count(links, eq(links.tokenHash, hashToken(token)))).toBe(1);
  });

  it("is told to be used when it has been", async () => {
    const { token } = await invite("twice");
    await joinAsNew(open(), answerOf(token));
    const again = {
      code: "gone",
      message: "This invitation has been used. If it was you, sign in; if not, tell the studio.",
    };
    expect(await refusalOf(joinAsNew(open(), answerOf(token)))).toMatchObject(again);
    expect(await refusalOf(openInvitation(studio, { token }))).toMatchObject(again);
  });

  it("says when it ended, and whom to ask, once its seven days are over", async () => {
    const { id, token } = await invite("late");
    const [link] = await studio.db.select().from(links).where(eq(links.id, id));
    const days = (link!.expiresAt.getTime() - link!.createdAt.getTime()) / 86_400_000;
    expect(days).toBeCloseTo(7, 3);
    await studio.db
      .update(links)
      .set({ expiresAt: new Date("2026-03-05T10:20:00Z") })
      .where(eq(links.id, id));
    expect(await refusalOf(joinAsNew(open(), answerOf(token)))).toMatchObject({
      code: "gone",
      message: "This invitation ended on 5 March 2026 at 10:20 UTC. Ask Producer Person for a new one.",
    });
  });

  it("says so when it was taken back, and cannot be taken back twice", async () => {
    const { id, token } = await invite("unwanted");
    await revokeInvitation(studio.as.owner, { invitation: id });
    expect(await refusalOf(joinAsNew(open(), answerOf(token)))).toMatchObject({
      code: "gone",
      message: "This invitation was taken back. Ask Producer Person for a new one.",
    });
    expect(await codeOf(revokeInvitation(studio.as.producer, { invitation: id }))).toBe("conflict");
  });

  it("takes the place of an earlier one to the same address", async () => {
    const first = await invite("again");
    const second = await invite("again");
    expect(await codeOf(openInvitation(studio, { token: first.token }))).toBe("gone");
    expect(await openInvitation(studio, { token: second.token })).toMatchObject({ email: second.email });
    expect(await lettersTo(studio.db, second.email)).toHaveLength(2);
  });

  it("is not opened by a token of ours for another purpose, a mangled one, or none", async () => {
    const { token } = await invite("mangled");
    for (const wrong of [token.slice(0, -1), `${token}x`, "", "%00"])
      expect(await refusalOf(openInvitation(studio, { token: wrong }))).toMatchObject({
        code: "gone",
        message:
          "This is not one of our links. A part of it may be lost: copy the whole link from the letter.",
      });
  });

  it("accepted twice at once lets one in and tells the other", async () => {
    const { email, token } = await invite("racing");
    const answers = await Promise.all([1, 2, 3].map(() => codeOf(joinAsNew(open(), answerOf(token)))));
    expect(answers.filter((code) => code === "nothing was refused")).toHaveLength(1);
    expect(answers.filter((code) => code === "conflict" || code === "gone")).toHaveLength(2);
    expect(await roleIn((await accountOf(studio.db, email)).id)).toHaveLength(1);
  });

  it("stops being tried from one machine after 30 tries in a quarter of an hour", async () => {
    const from = { db: studio.db, from: "198.51.100.77" };
    for (let tries = 0; tries < 30; tries += 1)
      expect(await codeOf(joinAsNew(from, answerOf("guess")))).toBe("gone");
    expect(await refusalOf(joinAsNew(from, answerOf("guess")))).toMatchObject({
      code: "too-many",
      message: "Too many tries. Wait 15 minutes, then try again.",
    });
  });
});

describe("an invitation to an address that has an account", () => {
  it("asks for the account's password, and changes nothing else of it", async () => {
    await addAccount(studio.db, address("known"));
    const { email, token } = await invite("known", "client");
    const before = await accountOf(studio.db, email);
    const wrong = await refusalOf(joinAsKnown({ ...open(), signedIn: null }, { token, password: "wrong" }));
    expect(wrong).toMatchObject({ code: "invalid", field: "password" });
    await joinAsKnown({ ...open(), signedIn: null }, { token, password: goodPassword });
    expect(await accountOf(studio.db, email)).toEqual(before);
    expect(await roleIn(before.id)).toEqual([["client", studio.production]]);
  });

  it("asks for nothing from someone signed in to that account, and is no use to anyone else", async () => {
    const { id } = await addAccount(studio.db, address("inside"));
    const { token } = await invite("inside");
    const other = { ...open(), signedIn: studio.as.artist.actor };
    expect(await codeOf(joinAsKnown(other, { token }))).toBe("invalid");
    const { actor } = await contextOf(studio.db, id);
    await joinAsKnown({ ...open(), signedIn: actor }, { token });
    expect(await roleIn(id)).toHaveLength(1);
  });

  it("is refused for someone who is in the production already", async () => {
    const twice = {
      productionId: studio.production,
      email: "artist@ringwright.example",
      name: "A",
      role: "client" as const,
    };
    expect(await refusalOf(invitePerson(studio.as.producer, twice))).toMatchObject({
      code: "conflict",
      field: "email",
      message: "Artist Person is in this production already, as artist.",
    });
  });

  it("opens a closed account anew, if the owner invites; a producer is told to ask the owner", async () => {
    const { id } = await addAccount(studio.db, address("returning"));
    await closeAccount(studio.as.owner, { person: id });
    const back = {
      productionId: studio.production,
      email: address("returning"),
      name: "R",
      role: "artist" as const,
    };
    expect(await codeOf(invitePerson(studio.as.producer, back))).toBe("conflict");
    await invitePerson(studio.as.owner, back);
    await joinAsNew(open(), answerOf(await newestToken(studio.db, back.email)));
    expect(await accountOf(studio.db, back.email)).toMatchObject({
      id,
      name: "Ilse Marn",
      leftAt: null,
      sessionEpoch: 3,
    });
  });
});

describe("who may invite", () => {
  it("is a producer of the production, or the owner", async () => {
    const wish = {
      productionId: studio.production,
      email: address("nobody"),
      name: "N",
      role: "artist" as const,
    };
    for (const who of ["artist", "advisor"] as const)
      expect(await codeOf(invitePerson(studio.as[who], wish)), who).toBe("forbidden");
    for (const who of ["client", "stranger"] as const)
      expect(await codeOf(invitePerson(studio.as[who], wish)), who).toBe("not-found");
    const { id } = await invite("guarded");
    expect(await codeOf(revokeInvitation(studio.as.stranger, { invitation: id }))).toBe("not-found");
    expect(await codeOf(revokeInvitation(studio.as.artist, { invitation: id }))).toBe("forbidden");
  });

  it("sees who is in and who is asked, of their own productions alone", async () => {
    const { id } = await invite("pending");
    const seen = await listPeople(studio.as.producer);
    expect(seen.productions.map((production) => production.id)).toEqual([studio.production]);
    expect(seen.productions[0]!.invitations.map((invitation) => invitation.id)).toContain(id);
    expect(seen.productions[0]!.members.map(({ role }) => role)).toEqual(
      expect.arrayContaining(["artist", "client"]),
    );
    expect(seen).toMatchObject({ mayCreate: false, mayClose: false, accounts: [] });
    expect((await listPeople(studio.as.owner)).productions).toHaveLength(2);
    expect(await codeOf(listPeople(studio.as.artist))).toBe("forbidden");
  });
});
