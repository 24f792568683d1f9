import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { getVersion } from "@/lib/versions/get-version";
import { listFiles } from "@/lib/versions/list-files";
import { runsOf } from "@/lib/versions/frame-names";
import { beginVersion, sealedVersion } from "../../support/frames";
import { openStudio, type Studio } from "../../support/studio";

let studio: Studio;
let version: string;
beforeAll(async () => {
  studio = await openStudio();
  version = (await sealedVersion(studio.as.artist, studio.shot)).id;
});
afterAll(() => studio.close());

describe("a version's page", () => {
  it("tells its digest, its frames, who made it and what happened to it, in order", async () => {
    const page = await getVersion(studio.as.advisor, { version });
    expect(page).toMatchObject({
      number: 1,
      standing: "ready",
      newer: null,
      finished: [{ first: 1001, last: 1002 }],
      maker: { name: "Artist Person" },
      render: { state: "complete", milliseconds: 500, unresolved: 0 },
      viewer: { role: "advisor", mayCancel: false, mayGiveVerdict: true, maySend: false },
    });
    expect(page.seal?.digest).toMatch(/^[0-9a-f]{64}$/);
    expect(page.history.map(({ sentence }) => sentence)).toEqual([
      "Artist Person began version 1 of AB-010: frames 1001–1002, proof.",
      "Version 1 of AB-010 is whole: frames 1001–1002.",
    ]);
  });

  it("says when a newer version governs, and keeps its own standing", async () => {
    const newer = await beginVersion(studio.as.artist, studio.shot);
    const page = await getVersion(studio.as.artist, { version });
    expect(page).toMatchObject({ standing: "ready", newer: { id: newer.id, number: 2 } });
    expect((await getVersion(studio.as.artist, { version: newer.id })).standing).toBe("rendering");
  });

  it("lists every file with its checksum under the name it is taken by", async () => {
    const { files, next } = await listFiles(studio.as.producer, { version, from: 0 });
    expect(next).toBeNull();
    expect(files.map(({ name }) => name)).toEqual([
      "AB-010_v001_1001.exr",
      "AB-010_v001_1001.png",
      "AB-010_v001_1002.exr",
      "AB-010_v001_1002.png",
    ]);
    expect((await listFiles(studio.as.producer, { version, from: 1002 })).files).toHaveLength(2);
  });
});

describe("runs of frames", () => {
  it("join neighbours and part at gaps", () => {
    expect(runsOf([1, 2, 4, 5, 6, 9])).toEqual([
      { first: 1, last: 2 },
      { first: 4, last: 6 },
      { first: 9, last: 9 },
    ]);
    expect(runsOf([])).toEqual([]);
  });
});
