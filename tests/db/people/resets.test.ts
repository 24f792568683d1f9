import { eq } from "drizzle-orm";
import { afterAll, beforeAll, beforeEach, describe, expect, it } from "vitest";
import { events } from "@/db/schema/events";
import { links, rateLimits } from "@/db/schema/people";
import { loadActor } from "@/lib/auth/load-actor";
import { askForReset } from "@/lib/people/ask-for-reset";
import { checkCredentials } from "@/lib/people/check-credentials";
import { invitePerson } from "@/lib/people/invite";
import { openInvitation } from "@/lib/people/open-invitation";
import { openReset, resetPassword } from "@/lib/people/reset-password";
import { addAccount, goodPassword, lettersTo, newestToken, prepareEnvironment } from "../../support/links";
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

const open = () => ({ db: studio.db, from: "203.0.113.1" });
const newPassword = "another four plain words";

async function ask(): Promise<string> {
  await askForReset(open(), { email });
  return newestToken(studio.db, email);
}

describe("asking for a new password", () => {
  it("answers in the same words whether or not the address has an account, and writes to accounts alone", async () => {
    const nobody = "nobody@ringwright.example";
    const known = await askForReset(open(), { email });
    const unknown = await askForReset(open(), { email: nobody });
    expect(unknown.words.replace(nobody, email)).toBe(known.words);
    expect(await lettersTo(studio.db, email)).toHaveLength(1);
    expect(await lettersTo(studio.db, nobody)).toHaveLength(0);
  });

  it("sends an address three letters an hour at most, and does not say so", async () => {
    const words = new Set<string>();
    for (let asks = 0; asks < 5; asks += 1) words.add((await askForReset(open(), { email })).words);
    expect(words.size).toBe(1);
    expect(await lettersTo(studio.db, email)).toHaveLength(3);
  });

  it("is refused to one machine after twenty times an hour", async () => {
    for (let asks = 0; asks < 20; asks += 1)
      await askForReset(open(), { email: `p${asks}@ringwright.example` });
    expect(await codeOf(askForReset(open(), { email }))).toBe("too-many");
  });
});

describe("a reset link", () => {
  it("sets a password once, ends every earlier session, tells the person, and is in the studio's log", async () => {
    const token = await ask();
    expect(await openReset(studio, { token })).toEqual({ email });
    await resetPassword(open(), { token, password: newPassword });
    const sign = (password: string) => checkCredentials(studio.db, { email, password, from: "203.0.113.9" });
    expect(await sign(goodPassword)).toBeNull();
    expect(await sign(newPassword)).toMatchObject({ id, epoch: 2 });
    expect(await loadActor(studio.db, id, 1)).toBeNull();
    expect((await lettersTo(studio.db, email)).at(-1)!.subject).toBe("Your password was changed");
    const logged = await studio.db.select().from(events).where(eq(events.actorId, id));
    expect(logged.map(({ kind, chain }) => [kind, chain])).toEqual([["password.changed", "studio"]]);
    expect(await refusalOf(resetPassword(open(), { token, password: newPassword }))).toMatchObject({
      code: "gone",
      message: "This link has been used. Ask for a new one on the sign-in page.",
    });
  });

  it("works for one hour and then says so", async () => {
    const token = await ask();
    const [link] = await studio.db.select().from(links).where(eq(links.email, email));
    expect(link!.expiresAt.getTime() - link!.createdAt.getTime()).toBeCloseTo(3_600_000, -4);
    await studio.db
      .update(links)
      .set({ expiresAt: new Date("2026-03-05T10:20:00Z") })
      .where(eq(links.id, link!.id));
    expect(await refusalOf(openReset(studio, { token }))).toMatchObject({
      code: "gone",
      message: "This link ended on 5 March 2026 at 10:20 UTC. Ask for a new one on the sign-in page.",
    });
  });

  it("gives way to a newer one", async () => {
    const older = await ask();
    const newer = await ask();
    expect((await refusalOf(openReset(studio, { token: older }))).message).toMatch(
      /^A newer link took this one's place/,
    );
    expect(await openReset(studio, { token: newer })).toEqual({ email });
  });

  it("used twice at once sets one password and tells the other", async () => {
    const token = await ask();
    const passwords = ["first four plain words", "second four plain words"];
    const codes = await Promise.all(
      passwords.map((password) => codeOf(resetPassword(open(), { token, password }))),
    );
    expect(codes.filter((code) => code === "nothing was refused")).toHaveLength(1);
    const winner = passwords[codes.indexOf("nothing was refused")]!;
    expect(await checkCredentials(studio.db, { email, password: winner, from: "203.0.113.9" })).toMatchObject(
      { epoch: 2 },
    );
  });

  it("opens no invitation, and an invitation sets no password", async () => {
    const token = await ask();
    expect(await codeOf(openInvitation(studio, { token }))).toBe("gone");
    const invitation = {
      productionId: studio.production,
      email,
      name: "Odo Ferrand",
      role: "artist" as const,
    };
    await invitePerson(studio.as.producer, invitation);
    expect(await codeOf(openReset(studio, { token: await newestToken(studio.db, email) }))).toBe("gone");
  });
});
