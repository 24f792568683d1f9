import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import { PUT as joinAsKnown, POST as joinAsNew } from "@/app/api/invitations/acceptance/route";
import { DELETE as revoke } from "@/app/api/invitations/[invitation]/route";
import { POST as invite } from "@/app/api/invitations/route";
import { GET as exportLog } from "@/app/api/log/route";
import { DELETE as close } from "@/app/api/people/[person]/route";
import { DELETE as remove } from "@/app/api/productions/[production]/people/[person]/route";
import { POST as begin } from "@/app/api/productions/route";
import { POST as setPassword } from "@/app/api/resets/password/route";
import { POST as askForReset } from "@/app/api/resets/route";
import type { Actor } from "@/lib/context";
import { database } from "@/lib/database";
import { addAccount, goodPassword, newestToken, prepareEnvironment } from "../support/links";
import { contextOf, openStudio, type Studio } from "../support/studio";

// Who asks is the one thing a Request alone cannot say: next-auth reads it from Next's own cookie store.
const signedIn = vi.hoisted(() => ({ actor: null as Actor | null }));
vi.mock("@/lib/auth/session", () => ({ currentActor: async () => signedIn.actor }));

let studio: Studio;
beforeAll(async () => {
  process.env.LOG_LEVEL = "silent";
  studio = await openStudio();
  prepareEnvironment(studio.url);
});
beforeEach(() => void (signedIn.actor = null));
afterAll(async () => {
  await database().$client.end();
  await studio.close();
});

type Handler = (request: Request, segment: { params: Promise<Record<string, string>> }) => Promise<Response>;

let machines = 0;
async function call(handler: Handler, body?: unknown, params: Record<string, string> = {}, headers = {}) {
  const request = new Request("http://127.0.0.1:3000/api/x", {
    method: "POST",
    headers: { host: "127.0.0.1:3000", "x-forwarded-for": `203.0.113.${(machines += 1)}`, ...headers },
    body: typeof body === "string" ? body : body === undefined ? undefined : JSON.stringify(body),
  });
  const response = await handler(request, { params: Promise.resolve(params) });
  const answer = (await response.json()) as { error?: { code: string; message: string; field?: string } };
  return { status: response.status, answer, error: answer?.error, response };
}
const as = (who: keyof Studio["as"]) => void (signedIn.actor = studio.as[who].actor);
const email = (name: string) => `${name}@ringwright.example`;
const invitation = (name: string) => ({
  productionId: studio.production,
  email: email(name),
  name,
  role: "artist",
});

describe("handlers about people", () => {
  it("ask who it is first, in words, and give the answer a request id", async () => {
    for (const handler of [invite, revoke, begin, remove, close]) {
      const { status, error, response } = await call(handler, {});
      expect([status, error?.message]).toEqual([401, "Sign in first."]);
      expect(response.headers.get("x-request-id")).toMatch(/^[0-9a-f-]{36}$/);
    }
  });

  it("refuse malformed input with the field at fault", async () => {
    as("producer");
    expect(await call(invite, "{email")).toMatchObject({ status: 400, error: { field: "body" } });
    const wrong = await call(invite, { ...invitation("a"), email: "nobody" });
    expect(wrong).toMatchObject({ status: 400, error: { code: "invalid", field: "email" } });
    expect(await call(remove, undefined, { production: "x", person: "y" })).toMatchObject({
      status: 400,
      error: { field: "production" },
    });
    expect(
      await call(joinAsNew, { token: "t", name: "A", password: "short", timeZone: "UTC" }),
    ).toMatchObject({
      status: 400,
      error: { field: "password" },
    });
  });

  it("answer 403 to a wrong role and 404 to someone from elsewhere", async () => {
    as("artist");
    expect(await call(invite, invitation("a"))).toMatchObject({
      status: 403,
      error: {
        message: "Only a producer of this production, or the studio's owner, can invite people into it.",
      },
    });
    expect((await call(begin, { code: "QQ", name: "Q", kind: "film" })).status).toBe(403);
    as("stranger");
    expect((await call(invite, invitation("a"))).status).toBe(404);
  });

  it("refuse a change asked for by another site's page", async () => {
    as("producer");
    const elsewhere = { origin: "https://elsewhere.example" };
    expect((await call(invite, invitation("a"), {}, elsewhere)).status).toBe(403);
    expect((await call(askForReset, { email: email("a") }, {}, elsewhere)).status).toBe(403);
  });

  it("carry an invitation from its sending to its use, and answer 410 in words to its second use", async () => {
    as("producer");
    expect((await call(invite, invitation("guest"))).status).toBe(200);
    signedIn.actor = null;
    const token = await newestToken(studio.db, email("guest"));
    const body = { token, name: "Guest", password: goodPassword, timeZone: "Europe/Oslo" };
    expect(await call(joinAsNew, body)).toMatchObject({ status: 200, answer: { email: email("guest") } });
    expect(await call(joinAsNew, body)).toMatchObject({
      status: 410,
      error: { code: "gone", message: expect.stringMatching(/^This invitation has been used\./) },
    });
  });

  it("let someone signed in join without a password, and nobody else", async () => {
    const { id } = await addAccount(studio.db, email("member"));
    as("producer");
    await call(invite, invitation("member"));
    const token = await newestToken(studio.db, email("member"));
    expect(await call(joinAsKnown, { token })).toMatchObject({ status: 400, error: { field: "password" } });
    signedIn.actor = (await contextOf(studio.db, id)).actor;
    expect((await call(joinAsKnown, { token })).status).toBe(200);
  });

  it("take an invitation back, a person out and an account away", async () => {
    as("owner");
    const { answer } = await call(invite, invitation("brief"));
    const { id } = answer as unknown as { id: string };
    expect((await call(revoke, undefined, { invitation: id })).status).toBe(200);
    expect((await call(revoke, undefined, { invitation: id })).status).toBe(409);
    const person = studio.ids.secondArtist;
    expect((await call(remove, undefined, { production: studio.production, person })).status).toBe(200);
    expect((await call(close, undefined, { person })).status).toBe(200);
    expect((await call(close, undefined, { person })).status).toBe(404);
  });

  it("answer a reset alike for anyone, and set the password by its link", async () => {
    await addAccount(studio.db, email("forgetful"));
    const known = await call(askForReset, { email: email("forgetful") });
    const unknown = await call(askForReset, { email: email("forgetfuk") });
    expect([known.status, unknown.status]).toEqual([200, 200]);
    expect(JSON.stringify(unknown.answer).replace("forgetfuk", "forgetful")).toBe(
      JSON.stringify(known.answer),
    );
    const token = await newestToken(studio.db, email("forgetful"));
    expect((await call(setPassword, { token, password: "four newer plain words" })).status).toBe(200);
    expect((await call(setPassword, { token, password: "four newer plain words" })).status).toBe(410);
  });

  it("answer 429 with the wait once a machine has tried too many links", async () => {
    const machine = { "x-forwarded-for": "198.51.100.9" };
    const body = { token: "guess", name: "G", password: goodPassword, timeZone: "UTC" };
    for (let tries = 0; tries < 30; tries += 1) await call(joinAsNew, body, {}, machine);
    expect(await call(joinAsNew, body, {}, machine)).toMatchObject({
      status: 429,
      error: { message: expect.stringMatching(/^Too many tries\. Wait \d+ minutes?, then try again\.$/) },
    });
  });

  it("give the log as a text to keep, to those who may read it", async () => {
    const get = (production: string) =>
      exportLog(new Request(`http://127.0.0.1:3000/api/log?production=${production}`), {
        params: Promise.resolve({}),
      });
    as("advisor");
    const response = await get(studio.production);
    expect(response.headers.get("content-type")).toBe("text/plain; charset=utf-8");
    expect(response.headers.get("content-disposition")).toContain("attachment");
    expect(await response.text()).toMatch(/^# Ringwright event log\./);
    expect((await get("nothing")).status).toBe(400);
    as("client");
    expect((await get(studio.production)).status).toBe(404);
  });
});
