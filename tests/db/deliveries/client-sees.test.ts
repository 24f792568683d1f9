// Guarantee 5: a client sees the deliveries published to them, and nothing else: not a thumbnail, not a shot code, not a count.
import { readdirSync, readFileSync } from "node:fs";
import { join, relative } from "node:path";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { Ctx } from "@/lib/context";
import { getDoor } from "@/lib/deliveries/get-door";
import { listDoors } from "@/lib/deliveries/list-doors";
import { listDoorFiles } from "@/lib/deliveries/list-door-files";
import { makeDelivery } from "@/lib/deliveries/make-delivery";
import { publishDelivery } from "@/lib/deliveries/publish-delivery";
import { DomainError } from "@/lib/errors";
import {
  addMember,
  choose,
  judge,
  openDeliveringStudio,
  publishedDelivery,
  sentVersion,
  signedVersion,
} from "../../support/delivery-life";
import { addShot, type Studio } from "../../support/studio";

type Verb = (ctx: Ctx, input: unknown, request: unknown) => Promise<unknown>;

const lib = join(import.meta.dirname, "..", "..", "..", "lib");
/** Every verb of lib: an exported function that is handed a request's context first. */
const signature = /export async function (\w+)\(\s*(?:ctx|\{[^}]*\}): Ctx\b/g;

const verbs: { name: string; file: string }[] = readdirSync(lib, { recursive: true, encoding: "utf8" })
  .filter((file) => file.endsWith(".ts"))
  .flatMap((file) =>
    [...readFileSync(join(lib, file), "utf8").matchAll(signature)].map((match) => ({
      name: match[1]!,
      file,
    })),
  );

let studio: Studio;
/** What the client must never meet: codes, words and digests of everything that was not published to them. */
let secrets: string[];
let hidden: { shot: string; version: string; delivery: string };
let published: { delivery: string; version: string };
let otherClient: Ctx;

beforeAll(async () => {
  studio = await openDeliveringStudio();
  otherClient = await addMember(studio, "Otherclient", "client");
  const place = { production: studio.production, sequence: studio.sequence, artist: studio.ids.artist };
  const secretShot = await addShot(studio.as.producer, place, "ZZ-701");
  const returned = await sentVersion(studio, secretShot);
  await judge(studio, returned, "returned");
  const kept = await signedVersion(studio, await addShot(studio.as.producer, place, "ZZ-702"));
  const made = await makeDelivery(studio.as.producer, choose(studio, [kept], { title: "Zzunpublished" }));
  const theirs = await signedVersion(studio, await addShot(studio.as.producer, place, "ZZ-703"));
  const forOthers = await makeDelivery(
    studio.as.producer,
    choose(studio, [theirs], { title: "Zzelsewhere" }),
  );
  await publishDelivery(studio.as.producer, {
    delivery: forOthers.delivery,
    recipients: [otherClient.actor.id],
    days: 7,
  });
  hidden = { shot: secretShot, version: returned, delivery: made.delivery };
  published = await publishedDelivery(studio);
  secrets = [
    "ZZ-70",
    "Zzunpublished",
    "Zzelsewhere",
    "far rim",
    "rim of light",
    "Otherclient",
    returned,
    made.delivery,
  ];
});
afterAll(() => studio.close());

/** One input that every verb finds its fields in, naming the given things. */
const inputOf = ({ shot, version, delivery }: { shot: string; version: string; delivery: string }) => ({
  ...{ shot, version, delivery, production: studio.production, set: version, sequence: studio.sequence },
  ...{ frame: 1001, first: 1001, last: 1002, kind: "png", limit: 100, revision: 1, days: 7, after: null },
  ...{
    words: "w",
    title: "t",
    what: "everything",
    download: version,
    figures: "00000000",
    path: ["README.txt"],
  },
  ...{
    items: [],
    formats: ["png"],
    layout: "by shot",
    separator: ".",
    digits: 4,
    recipients: [],
    shots: [shot],
  },
  ...{
    person: studio.ids.artist,
    email: "x@ringwright.example",
    name: "X",
    role: "artist",
    code: "AB-990",
    brief: "b",
  },
  ...{ manifestDigest: "0".repeat(64), setup: {}, quality: "proof", colourSpace: "rec709", invitation: shot },
});

async function everythingSaid(run: Promise<unknown>): Promise<string> {
  try {
    const result = await run;
    if (result instanceof Response) return await result.text();
    return JSON.stringify(result) ?? "";
  } catch (error) {
    // An input that a verb cannot read at all is refused by its schema in a real request; only words can leak here.
    return error instanceof DomainError ? error.message : "";
  }
}

async function call(
  { name, file }: { name: string; file: string },
  ctx: Ctx,
  input: unknown,
): Promise<string> {
  const verbFile = (await import(join(lib, file))) as Record<string, Verb>;
  return everythingSaid(verbFile[name]!(ctx, input, new Request("http://here/")));
}

describe("what a client can learn", () => {
  it("is asked of every verb there is", () => {
    expect(verbs.map(({ name }) => name)).toEqual(
      expect.arrayContaining([
        "listQueue",
        "getDeclaration",
        "listShots",
        "getVersion",
        "listDeliveries",
        "listEvents",
        "getSetup",
      ]),
    );
  });

  it("would be noticed: the same questions, asked by a member, are answered with the secrets", async () => {
    const said = await Promise.all(verbs.map((verb) => call(verb, studio.as.producer, inputOf(hidden))));
    for (const secret of ["ZZ-701", "Zzunpublished", "Zzelsewhere", "far rim"])
      expect(said.join("\n")).toContain(secret);
  });

  it.each(verbs)("$name says nothing of what was not published to them", async (verb) => {
    for (const ids of [
      hidden,
      { ...hidden, delivery: published.delivery },
      { ...hidden, version: published.version },
    ]) {
      const said = await call(verb, studio.as.client, inputOf(ids));
      for (const secret of secrets)
        expect(said, `${verb.name} in ${relative(lib, verb.file)}`).not.toContain(secret);
    }
  });

  it("is, for another client of the same production, not even this delivery's existence", async () => {
    for (const verb of verbs) {
      const said = await call(verb, otherClient, inputOf({ ...published, shot: studio.shot }));
      for (const secret of ["AB-010", "First light", "As physics has it"])
        expect(said, verb.name).not.toContain(secret);
    }
  });

  it("is, before anything is published to them, an empty list", async () => {
    const newcomer = await addMember(studio, "Newcomer", "client");
    expect(await listDoors(newcomer)).toEqual([]);
    for (const verb of verbs)
      expect(
        await call(verb, newcomer, inputOf({ ...published, shot: studio.shot })),
        verb.name,
      ).not.toContain("AB-010");
  });

  it("is, of what was published to them, all of it", async () => {
    const { delivery } = published;
    expect((await listDoors(studio.as.client)).map(({ id }) => id)).toEqual([delivery]);
    const door = await getDoor(studio.as.client, { delivery });
    expect(door.contents?.sets).toMatchObject([{ shotCode: "AB-010", first: 1001, last: 1002, files: 4 }]);
    expect((await listDoorFiles(studio.as.client, { delivery })).files).toHaveLength(door.contents!.files);
  });
});
