import { mkdtempSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import sharp from "sharp";
import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import { GET as follow } from "@/app/api/changes/route";
import { POST as addSequence } from "@/app/api/sequences/route";
import { GET as readSetup, PUT as saveSetup } from "@/app/api/shots/[shot]/setup/route";
import { GET as listVersions, POST as render } from "@/app/api/shots/[shot]/versions/route";
import { GET as listShots, PATCH as changeShots, POST as addShot } from "@/app/api/shots/route";
import { POST as cancel } from "@/app/api/versions/[version]/cancel/route";
import { GET as listFiles } from "@/app/api/versions/[version]/files/route";
import { GET as takeFile } from "@/app/api/versions/[version]/frames/[frame]/[kind]/route";
import { GET as thumbnail } from "@/app/api/versions/[version]/frames/[frame]/thumbnail/route";
import { POST as resume } from "@/app/api/versions/[version]/resume/route";
import { GET as readVersion } from "@/app/api/versions/[version]/route";
import { readRange } from "@/app/api/versions/[version]/file-response";
import type { Actor } from "@/lib/context";
import { setups } from "@/db/schema/shots";
import { database } from "@/lib/database";
import { saveSetup as save } from "@/lib/setups/save-setup";
import { folderStorage } from "@/lib/storage/folder";
import { openWorkshop, quickFrame, sealedVersion } from "../support/frames";
import { openStudio, smallSetup, type Studio } from "../support/studio";

// Who asks is the one thing a Request alone cannot say: next-auth reads it from Next's own cookie store.
const signedIn = vi.hoisted(() => {
  process.env.LOG_LEVEL = "silent";
  return { actor: null as Actor | null };
});
vi.mock("@/lib/auth/session", () => ({ currentActor: async () => signedIn.actor }));

let studio: Studio;
let version: string;
const exr = Buffer.from("scene-linear light, as a compositor takes it");

beforeAll(async () => {
  studio = await openStudio();
  process.env.DATABASE_URL = studio.url;
  process.env.STORAGE_DIR = mkdtempSync(join(tmpdir(), "ringwright-routes-"));
  const png = await sharp({ create: { width: 400, height: 216, channels: 3, background: "#804010" } })
    .png()
    .toBuffer();
  const store = folderStorage(process.env.STORAGE_DIR);
  const renderFrame: typeof quickFrame = async (...asked) => ({ ...(await quickFrame(...asked)), png, exr });
  version = (
    await sealedVersion(studio.as.artist, studio.shot, openWorkshop(studio.db, { store, renderFrame }))
  ).id;
});
beforeEach(() => void (signedIn.actor = null));
afterAll(async () => {
  await database().$client.end();
  await studio.close();
});

type Params = Record<string, string | string[]>;
type Handler = (request: Request, segment: { params: Promise<Params> }) => Promise<Response>;
const as = (who: keyof Studio["as"]) => void (signedIn.actor = studio.as[who].actor);

function ask(
  handler: Handler,
  params: Params = {},
  init: RequestInit & { query?: string } = {},
): Promise<Response> {
  const request = new Request(`http://127.0.0.1:3000/api/x${init.query ?? ""}`, init);
  return handler(request, { params: Promise.resolve(params) });
}
const post = (body: unknown): RequestInit => ({
  method: "POST",
  body: typeof body === "string" ? body : JSON.stringify(body),
});
const refusal = async (response: Promise<Response>) => {
  const answer = await response;
  const { error } = (await answer.json()) as { error: { code: string; field?: string } };
  return [answer.status, error.code, error.field];
};

const frame = (kind: string) => ({ version, frame: "1001", kind });

const everything: [string, Handler, () => Params][] = [
  ["list shots", listShots, () => ({})],
  ["read a setup", readSetup, () => ({ shot: studio.shot })],
  ["list versions", listVersions, () => ({ shot: studio.shot })],
  ["read a version", readVersion, () => ({ version })],
  ["list files", listFiles, () => ({ version })],
  ["take a file", takeFile, () => frame("png")],
  ["see a thumbnail", thumbnail, () => ({ version, frame: "1001", width: "168" })],
];

describe("the routes of shots and versions", () => {
  it.each(everything)("ask who wants to %s before anything else", async (_what, handler, params) => {
    expect(await refusal(ask(handler, params()))).toEqual([401, "not-signed-in", undefined]);
  });

  it.each(everything)(
    "let no client %s, not even to learn that it exists",
    async (_what, handler, params) => {
      as("client");
      expect(await refusal(ask(handler, params()))).toEqual([404, "not-found", undefined]);
    },
  );

  it.each(everything)("let a member %s", async (_what, handler, params) => {
    as("advisor");
    expect((await ask(handler, params())).status).toBe(200);
  });

  it.each([
    ["add a shot", addShot, {}],
    ["add a sequence", addSequence, {}],
    ["change shots", changeShots, {}],
    ["save a setup", saveSetup, { shot: "1" }],
    ["render a version", render, { shot: "1" }],
    ["cancel", cancel, { version: "1" }],
    ["resume", resume, { version: "1" }],
  ] as [string, Handler, Params][])(
    "name what is missing when asked to %s with nonsense",
    async (_what, handler, params) => {
      as("producer");
      expect((await refusal(ask(handler, params, post("{ not json"))))[2]).toBe("body");
      const [status, code, field] = await refusal(ask(handler, params, post({})));
      expect([status, code]).toEqual([400, "invalid"]);
      expect(field).toBeTruthy();
    },
  );

  it("name the very field of a setup that cannot be", async () => {
    as("artist");
    const setup = { ...smallSetup, hole: { ...smallSetup.hole, spin: 1.2 } };
    const asked = ask(saveSetup, { shot: studio.shot }, { ...post({ revision: 1, setup }), method: "PUT" });
    expect(await refusal(asked)).toEqual([400, "invalid", "setup.hole.spin"]);
  });
});

describe("a frame's file", () => {
  it("comes with its checksum as its tag, to be kept for good by the one who asked", async () => {
    as("artist");
    const response = await ask(takeFile, frame("exr"));
    expect(Buffer.from(await response.arrayBuffer())).toEqual(exr);
    expect(response.headers.get("etag")).toMatch(/^"[0-9a-f]{64}"$/);
    expect(response.headers.get("cache-control")).toBe("private, max-age=31536000, immutable");
    expect(response.headers.get("content-disposition")).toBe('attachment; filename="AB-010_v001_1001.exr"');
    const again = await ask(takeFile, frame("exr"), {
      headers: { "if-none-match": response.headers.get("etag") ?? "" },
    });
    expect(again.status).toBe(304);
  });

  it("can be taken from the middle on, and says so when asked for what is not there", async () => {
    as("artist");
    const part = await ask(takeFile, frame("exr"), { headers: { range: "bytes=6-" } });
    expect([part.status, part.headers.get("content-range")]).toEqual([
      206,
      `bytes 6-${exr.length - 1}/${exr.length}`,
    ]);
    expect(Buffer.from(await part.arrayBuffer())).toEqual(exr.subarray(6));
    const beyond = await ask(takeFile, frame("exr"), { headers: { range: "bytes=1000-" } });
    expect(beyond.status).toBe(416);
  });

  it("is not there for a frame the version does not have, and not for a kind that does not exist", async () => {
    as("artist");
    expect(await refusal(ask(takeFile, { ...frame("png"), frame: "1009" }))).toEqual([
      404,
      "not-found",
      undefined,
    ]);
    expect(await refusal(ask(takeFile, frame("gif")))).toEqual([400, "invalid", "kind"]);
  });

  it("is shown small as a picture of the asked width and no other", async () => {
    as("producer");
    const small = await ask(thumbnail, { version, frame: "1001", width: "168" });
    expect(small.headers.get("content-type")).toBe("image/webp");
    expect(await sharp(Buffer.from(await small.arrayBuffer())).metadata()).toMatchObject({
      width: 168,
      height: 91,
    });
    expect(await refusal(ask(thumbnail, { version, frame: "1001", width: "5000" }))).toEqual([
      400,
      "invalid",
      "width",
    ]);
  });

  it.each([
    ["bytes=0-3", { start: 0, end: 3 }],
    ["bytes=-4", { start: 6, end: 9 }],
    ["bytes=4-", { start: 4, end: 9 }],
    ["bytes=4-99", { start: 4, end: 9 }],
    ["bytes=10-", "outside"],
    ["bytes=5-3", "outside"],
    ["bytes=0-1,4-5", undefined],
    ["items=0-1", undefined],
    [null, undefined],
  ])("understands the range %s of ten bytes", (header, range) => {
    expect(readRange(header, 10)).toEqual(range);
  });
});

describe("the stream of changes", () => {
  /** Reads the stream until this many changes have come. */
  async function hear(wanted: number, then: () => Promise<unknown>): Promise<Record<string, unknown>[]> {
    const leave = new AbortController();
    const response = await ask(follow, {}, { signal: leave.signal });
    expect(response.headers.get("content-type")).toMatch(/^text\/event-stream/);
    const reader = response.body!.pipeThrough(new TextDecoderStream()).getReader();
    let text = "";
    const changes = () =>
      [...text.matchAll(/^data: (.*)$/gm)].map(([, json]) => JSON.parse(json!) as Record<string, unknown>);
    const reading = (async () => {
      while (changes().length < wanted) {
        const { value, done } = await reader.read();
        if (done) break;
        text += value;
      }
    })();
    // The listening connection may still be on its way: the change is made again until it is heard.
    const repeat = setInterval(() => void then(), 300);
    await then();
    await reading;
    clearInterval(repeat);
    leave.abort();
    return changes();
  }

  const touch = async () => {
    const [row] = await studio.db.select().from(setups);
    const input = { shot: studio.shot, revision: row!.revision, setup: smallSetup };
    await save(studio.as.artist, input).catch(() => undefined);
  };

  it("tells a member what changed by ids and numbers, without words", async () => {
    as("advisor");
    const [change] = await hear(1, touch);
    expect(change).toMatchObject({
      kind: "setup.saved",
      productionId: studio.production,
      shotId: studio.shot,
    });
    expect(Object.keys(change!).sort()).toEqual(["byId", "kind", "productionId", "revision", "shotId"]);
  });

  it("is refused to someone who is not signed in", async () => {
    expect(await refusal(ask(follow))).toEqual([401, "not-signed-in", undefined]);
  });
});
