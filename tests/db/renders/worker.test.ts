import { createHash } from "node:crypto";
import { mkdtempSync } from "node:fs";
import { rm } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { asc, eq, like } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { events, outbox } from "@/db/schema/events";
import { frameFiles, frames, renders, seals, versions } from "@/db/schema/versions";
import { folderStorage } from "@/lib/storage/folder";
import { closePool } from "@/render/hosts/node/pool";
import { renderFrame } from "@/render/hosts/node/render-frame";
import { kernelVersion } from "@/render/kernel-version";
import { beginVersion } from "../../support/frames";
import { addShot, openStudio, smallSetup, type Studio } from "../../support/studio";
import { startWorker, until } from "../../support/worker";

let studio: Studio;
const STORAGE_DIR = mkdtempSync(join(tmpdir(), "ringwright-worker-"));
beforeAll(async () => void (studio = await openStudio()));
afterAll(async () => {
  await closePool();
  await studio.close();
  await rm(STORAGE_DIR, { recursive: true });
});

const work = () => startWorker({ DATABASE_URL: studio.url, STORAGE_DIR });
const countFrames = (id: string) => studio.db.$count(frames, eq(frames.versionId, id));
const stateOf = async (id: string) =>
  (await studio.db.select().from(renders).where(eq(renders.versionId, id)))[0]!.state;

/** Five frames, two jobs, that take long enough to be interrupted. */
async function begin(code: string) {
  const setup = {
    ...smallSetup,
    time: { ...smallSetup.time, last: 1005 },
    picture: { ...smallSetup.picture, width: 240, height: 135 },
  };
  const { production, sequence, ids, as } = studio;
  const shot = await addShot(as.producer, { production, sequence, artist: ids.artist }, code, setup);
  const { id } = await beginVersion(as.artist, shot, { last: 1005 });
  return { id, setup };
}

async function expectWhole(id: string): Promise<void> {
  expect(await countFrames(id)).toBe(5);
  expect(await studio.db.$count(seals, eq(seals.versionId, id))).toBe(1);
  expect(await studio.db.$count(outbox, like(outbox.key, `mail version.complete ${id}`))).toBe(1);
  const complete = await studio.db.select().from(events).where(eq(events.kind, "version.complete"));
  expect(complete.filter(({ subject }) => subject.versionId === id)).toHaveLength(1);
}

describe("the worker process", () => {
  it("killed in mid-render, leaves a version that the next worker finishes whole, with the bytes it would have had", async () => {
    const { id, setup } = await begin("AB-020");
    const first = work();
    await until(async () => (await countFrames(id)) >= 1);
    expect(await first.end("SIGKILL")).toBeNull();
    expect(await stateOf(id)).toBe("rendering");

    const second = work();
    await until(async () => (await stateOf(id)) !== "rendering");
    expect(await second.end("SIGTERM")).toBe(0);
    await expectWhole(id);

    const [version] = await studio.db.select().from(versions).where(eq(versions.id, id));
    const files = await studio.db
      .select()
      .from(frameFiles)
      .where(eq(frameFiles.versionId, id))
      .orderBy(asc(frameFiles.frame), asc(frameFiles.kind));
    const { setupDigest, quality, colourSpace } = version!;
    for (const frame of [1001, 1002, 1003, 1004, 1005]) {
      const request = { frame, quality, colourSpace, setupDigest, kernelVersion };
      const { exr, png } = await renderFrame(setup, request);
      const expected = [exr, png].map((bytes) => createHash("sha256").update(bytes).digest("hex"));
      expect(files.filter((file) => file.frame === frame).map(({ sha256 }) => sha256)).toEqual(expected);
    }
    const store = folderStorage(STORAGE_DIR);
    for (const { sha256 } of files) expect(await store.verify(sha256)).toBe(true);
  });

  it("told to stop in mid-render, ends by itself and puts its work back for the next", async () => {
    const { id } = await begin("AB-030");
    const first = work();
    await until(async () => (await countFrames(id)) >= 1);
    expect(await first.end("SIGTERM")).toBe(0);
    expect(await stateOf(id)).toBe("rendering");

    const second = work();
    await until(async () => (await stateOf(id)) !== "rendering");
    await second.end("SIGTERM");
    await expectWhole(id);
  });
});
