import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import { GET as takeArchive } from "@/app/api/deliveries/[delivery]/archive/route";
import { GET as takeFile } from "@/app/api/deliveries/[delivery]/files/[...path]/route";
import { GET as listFiles } from "@/app/api/deliveries/[delivery]/files/route";
import { GET as lookAt } from "@/app/api/deliveries/[delivery]/pictures/[version]/route";
import { POST as publish } from "@/app/api/deliveries/[delivery]/publication/route";
import { POST as sign } from "@/app/api/deliveries/[delivery]/receipt/route";
import { GET as open } from "@/app/api/deliveries/[delivery]/route";
import { POST as withdraw } from "@/app/api/deliveries/[delivery]/withdrawal/route";
import { POST as make } from "@/app/api/deliveries/route";
import { POST as measure } from "@/app/api/deliveries/size/route";
import { POST as send } from "@/app/api/versions/[version]/submission/route";
import { GET as declaration, POST as judge } from "@/app/api/versions/[version]/verdicts/route";
import { POST as takeBack } from "@/app/api/versions/[version]/verdicts/withdrawal/route";
import type { Actor } from "@/lib/context";
import { database } from "@/lib/database";
import { choose, openDeliveringStudio, signedVersion, wholeVersion } from "../support/delivery-life";
import type { Studio } from "../support/studio";

// Who asks is the one thing a Request alone cannot say: next-auth reads it from Next's own cookie store.
const signedIn = vi.hoisted(() => {
  process.env.LOG_LEVEL = "silent";
  return { actor: null as Actor | null };
});
vi.mock("@/lib/auth/session", () => ({ currentActor: async () => signedIn.actor }));

let studio: Studio;
beforeAll(async () => {
  studio = await openDeliveringStudio();
});
beforeEach(() => void (signedIn.actor = null));
afterAll(async () => {
  await database().$client.end();
  await studio.close();
});

type Params = Record<string, string | string[]>;
type Handler = (request: Request, segment: { params: Promise<Params> }) => Promise<Response>;
const as = (who: keyof Studio["as"]) => void (signedIn.actor = studio.as[who].actor);

function ask(handler: Handler, params: Params = {}, body?: unknown): Promise<Response> {
  const text = typeof body === "string" ? body : JSON.stringify(body);
  const init = body === undefined ? {} : { method: "POST", body: text };
  return handler(new Request("http://127.0.0.1:3000/api/x", init), { params: Promise.resolve(params) });
}
const refusal = async (response: Promise<Response>) => {
  const answer = await response;
  const { error } = (await answer.json()) as { error: { code: string; field?: string } };
  return [answer.status, error.code, error.field];
};

const id = "3f0c6b1e-0000-4000-8000-000000000000";
const posts: [string, Handler, Params][] = [
  ["make", make, {}],
  ["measure", measure, {}],
  ["publish", publish, { delivery: id }],
  ["withdraw", withdraw, { delivery: id }],
  ["sign", sign, { delivery: id }],
  ["send", send, { version: id }],
  ["judge", judge, { version: id }],
  ["take back", takeBack, { version: id }],
];
const gets: [string, Handler, Params][] = [
  ["open", open, { delivery: id }],
  ["archive", takeArchive, { delivery: id }],
  ["files", listFiles, { delivery: id }],
  ["file", takeFile, { delivery: id, path: ["README.txt"] }],
  ["picture", lookAt, { delivery: id, version: id }],
  ["declaration", declaration, { version: id }],
];

describe("the handlers of reviews and deliveries", () => {
  it.each([...posts, ...gets])("%s asks who it is first", async (_name, handler, params) => {
    expect(await refusal(ask(handler, params))).toEqual([401, "not-signed-in", undefined]);
  });

  it.each(posts)(
    "%s answers 400 to what is no JSON, and names the field that is missing",
    async (_name, handler, params) => {
      as("producer");
      expect(await refusal(ask(handler, params, "{"))).toEqual([400, "invalid", "body"]);
      const [status, code, field] = await refusal(ask(handler, params, {}));
      expect([status, code, typeof field]).toEqual([400, "invalid", "string"]);
    },
  );

  it.each(gets)(
    "%s answers 400 to an id that is none, and 404 to one that is nobody's",
    async (_name, handler, params) => {
      as("client");
      const broken = Object.fromEntries(
        Object.entries(params).map(([name, value]) => [name, value === id ? "x" : value]),
      );
      expect((await refusal(ask(handler, broken)))[0]).toBe(400);
      expect(await refusal(ask(handler, params))).toEqual([404, "not-found", undefined]);
    },
  );
});

describe("a delivery through its handlers", () => {
  it("goes from a signed version to a receipt", async () => {
    const signed = await signedVersion(studio);
    as("producer");
    const choice = choose(studio, [signed]);
    const size = (await (await ask(measure, {}, choice)).json()) as { files: number };
    const { delivery } = (await (await ask(make, {}, choice)).json()) as { delivery: string };
    await ask(publish, { delivery }, { recipients: [studio.ids.client] });
    expect(await refusal(ask(takeArchive, { delivery }))).toEqual([403, "forbidden", undefined]);

    as("client");
    const archive = await ask(takeArchive, { delivery });
    expect(archive.headers.get("content-type")).toBe("application/zip");
    expect(archive.headers.get("x-request-id")).toBeTruthy();
    expect((await archive.arrayBuffer()).byteLength).toBe(Number(archive.headers.get("content-length")));
    const { files } = (await (await ask(listFiles, { delivery })).json()) as { files: { path: string }[] };
    expect(files).toHaveLength(size.files);
    const readme = await ask(takeFile, { delivery, path: ["README.txt"] });
    expect(await readme.text()).toContain("sha256sum --check");
    const { door } = (await (await ask(open, { delivery })).json()) as { door: { manifestDigest: string } };
    const receipt = { kind: "received", manifestDigest: door.manifestDigest };
    expect((await ask(sign, { delivery }, receipt)).status).toBe(200);
    expect(await refusal(ask(sign, { delivery }, receipt))).toEqual([409, "conflict", undefined]);

    as("stranger");
    expect(await refusal(ask(open, { delivery }))).toEqual([404, "not-found", undefined]);
  });

  it("refuses the wrong role with 403 and another production with 404", async () => {
    const version = await wholeVersion(studio);
    const words = { words: "Look." };
    as("advisor");
    expect(await refusal(ask(send, { version }, words))).toEqual([403, "forbidden", undefined]);
    as("stranger");
    expect(await refusal(ask(send, { version }, words))).toEqual([404, "not-found", undefined]);
    as("artist");
    expect((await ask(send, { version }, words)).status).toBe(200);
    expect(await refusal(ask(send, { version }, words))).toEqual([409, "conflict", undefined]);
  });
});
