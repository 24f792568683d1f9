import { readdir, rm, writeFile } from "node:fs/promises";
import { mkdtempSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { and, asc, eq, like } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { events, outbox } from "@/db/schema/events";
import { frameFiles, frames, renders, seals, versions } from "@/db/schema/versions";
import { makeCancellations } from "@/lib/renders/cancellations";
import { mendRenders } from "@/lib/renders/mend-renders";
import { runFrameJob, type Workshop } from "@/lib/renders/run-frame-job";
import { sealVersion } from "@/lib/renders/seal-version";
import { folderStorage } from "@/lib/storage/folder";
import { cancelVersion } from "@/lib/versions/cancel-version";
import { resumeVersion } from "@/lib/versions/resume-version";
import { beginVersion, jobsOf, openWorkshop, quickFrame } from "../../support/frames";
import { addShot, openStudio, type Studio } from "../../support/studio";

let studio: Studio;
let count = 0;
beforeAll(async () => void (studio = await openStudio()));
afterAll(() => studio.close());

/** A version of a shot of its own. */
async function begin(): Promise<string> {
  count += 1;
  const { production, sequence, ids, as } = studio;
  const shot = await addShot(as.producer, { production, sequence, artist: ids.artist }, `AB-${100 + count}`);
  return (await beginVersion(as.artist, shot)).id;
}

const jobOf = async (id: string) => (await jobsOf(studio.db, id)).at(-1)!;
const renderOf = async (id: string) =>
  (await studio.db.select().from(renders).where(eq(renders.versionId, id)))[0]!;
const filesOf = (id: string) =>
  studio.db
    .select()
    .from(frameFiles)
    .where(eq(frameFiles.versionId, id))
    .orderBy(asc(frameFiles.frame), asc(frameFiles.kind));
const eventsOf = async (id: string, kind: string) =>
  (await studio.db.select().from(events).where(eq(events.kind, kind))).filter(
    ({ subject }) => subject.versionId === id,
  );
const lettersOf = (key: string) =>
  studio.db
    .select()
    .from(outbox)
    .where(and(eq(outbox.kind, "mail"), like(outbox.key, `mail ${key}%`)));

describe("a job of frames", () => {
  it("keeps every frame, seals the version once and writes to its maker once, however often it is done", async () => {
    const id = await begin();
    const shop = openWorkshop(studio.db);
    const job = await jobOf(id);
    await Promise.all([runFrameJob(shop, job), runFrameJob(shop, job)]);
    await runFrameJob(shop, job);
    expect(await filesOf(id)).toHaveLength(4);
    expect(await renderOf(id)).toMatchObject({ state: "complete", failure: null });
    expect(await studio.db.select().from(seals).where(eq(seals.versionId, id))).toHaveLength(1);
    expect(await eventsOf(id, "version.complete")).toHaveLength(1);
    expect(await lettersOf(`version.complete ${id}`)).toHaveLength(1);
  });

  it("skips a frame whose row and bytes agree, and renders again one whose bytes are gone", async () => {
    const id = await begin();
    const rendered: number[] = [];
    const shop = openWorkshop(studio.db, {
      renderFrame: async (setup, request) => {
        rendered.push(request.frame);
        if (request.frame === 1002 && rendered.length === 2) throw new Error("lost power");
        return quickFrame(setup, request);
      },
    });
    await runFrameJob(shop, await jobOf(id));
    await resumeVersion(studio.as.artist, { version: id });
    await runFrameJob(shop, { ...(await jobOf(id)), first: 1001 });
    expect(rendered).toEqual([1001, 1002, 1002]);
    expect((await renderOf(id)).state).toBe("complete");
  });

  it("mends a kept frame whose stored bytes were damaged, with the same bytes", async () => {
    const id = await begin();
    const root = mkdtempSync(join(tmpdir(), "ringwright-damage-"));
    const store = folderStorage(root);
    const shop = openWorkshop(studio.db, { store });
    const job = await jobOf(id);
    await runFrameJob(shop, { ...job, last: 1001 });
    const { sha256 } = (await filesOf(id))[0]!;
    await writeFile(join(root, sha256.slice(0, 2), sha256.slice(2)), "damaged");
    await runFrameJob(shop, job);
    expect(await store.verify(sha256)).toBe(true);
    expect((await renderOf(id)).state).toBe("complete");
  });

  it("says which frame failed and why, keeps what is finished, writes once, and can be resumed to the end", async () => {
    const id = await begin();
    const broken: Workshop["renderFrame"] = async (setup, request) => {
      if (request.frame === 1002) throw new Error("Pixel 7, 9 has no end.");
      return quickFrame(setup, request);
    };
    const job = await jobOf(id);
    await runFrameJob(openWorkshop(studio.db, { renderFrame: broken }), job);
    expect(await renderOf(id)).toMatchObject({
      state: "failed",
      failedFrame: 1002,
      failure: "Pixel 7, 9 has no end.",
    });
    expect(await filesOf(id)).toHaveLength(2);
    const [event] = await eventsOf(id, "version.failed");
    expect(event?.subject).toMatchObject({ frame: 1002, why: expect.stringContaining("Pixel 7, 9") });
    expect(await lettersOf(`version.failed ${id}`)).toHaveLength(1);

    await resumeVersion(studio.as.artist, { version: id });
    const again = await jobOf(id);
    expect(again).toMatchObject({ attempt: 2, first: 1002, last: 1002 });
    await runFrameJob(openWorkshop(studio.db), again);
    expect((await renderOf(id)).state).toBe("complete");
  });

  it("fails in words when the disk is full", async () => {
    const id = await begin();
    const store = folderStorage(mkdtempSync(join(tmpdir(), "ringwright-full-")));
    const full = {
      ...store,
      put: () => Promise.reject(Object.assign(new Error("write"), { code: "ENOSPC" })),
    };
    await runFrameJob(openWorkshop(studio.db, { store: full }), await jobOf(id));
    expect((await renderOf(id)).failure).toMatch(/no room left/);
  });

  it("leaves a fault that may pass to the queue, changing nothing", async () => {
    const id = await begin();
    const store = folderStorage(mkdtempSync(join(tmpdir(), "ringwright-away-")));
    const away = {
      ...store,
      put: () => Promise.reject(Object.assign(new Error("away"), { code: "ECONNRESET" })),
    };
    const job = await jobOf(id);
    await expect(runFrameJob(openWorkshop(studio.db, { store: away }), job)).rejects.toThrow("away");
    expect((await renderOf(id)).state).toBe("rendering");
  });

  it("refuses to mix in a frame that comes out with other bytes", async () => {
    const id = await begin();
    const root = mkdtempSync(join(tmpdir(), "ringwright-other-"));
    const job = await jobOf(id);
    await runFrameJob(openWorkshop(studio.db, { store: folderStorage(root) }), { ...job, last: 1001 });
    for (const name of await readdir(root)) await rm(join(root, name), { recursive: true });
    const other: Workshop["renderFrame"] = async (setup, request) => ({
      ...(await quickFrame(setup, request)),
      exr: Buffer.from("other bytes"),
    });
    await runFrameJob(openWorkshop(studio.db, { store: folderStorage(root), renderFrame: other }), job);
    expect(await renderOf(id)).toMatchObject({ state: "failed", failedFrame: 1001 });
    expect((await renderOf(id)).failure).toMatch(/EXR came out with other bytes/);
  });

  it("does nothing for an attempt that was cancelled or taken up anew", async () => {
    const id = await begin();
    const job = await jobOf(id);
    await cancelVersion(studio.as.artist, { version: id });
    await runFrameJob(openWorkshop(studio.db), job);
    expect(await filesOf(id)).toHaveLength(0);
    await resumeVersion(studio.as.artist, { version: id });
    await runFrameJob(openWorkshop(studio.db), job);
    expect(await filesOf(id)).toHaveLength(0);
    await runFrameJob(openWorkshop(studio.db), await jobOf(id));
    expect((await renderOf(id)).state).toBe("complete");
  });

  it("will not continue a version that another kernel began", async () => {
    const id = await begin();
    const [version] = await studio.db.select().from(versions).where(eq(versions.id, id));
    const [other] = await studio.db
      .insert(versions)
      .values({ ...version!, id: undefined, number: 2, kernel: "p0.1" })
      .returning();
    await studio.db.insert(renders).values({ versionId: other!.id });
    await runFrameJob(openWorkshop(studio.db), { versionId: other!.id, attempt: 1, first: 1001, last: 1001 });
    expect((await renderOf(other!.id)).failure).toMatch(/begun with kernel p0.1, and this worker has/);
    await expect(resumeVersion(studio.as.artist, { version: other!.id })).rejects.toThrow(
      "render a new version",
    );
  });

  it("stops a frame mid-way when its version is cancelled elsewhere", async () => {
    const id = await begin();
    const stops = makeCancellations();
    const ending = new AbortController();
    const listening = stops.listen(studio.db, studio.url, ending.signal);
    let begun = () => {};
    const started = new Promise<void>((resolve) => (begun = resolve));
    const endless: Workshop["renderFrame"] = (_setup, { signal }) =>
      new Promise((_resolve, reject) => {
        signal?.addEventListener("abort", () => reject(signal.reason as Error));
        begun();
      });
    const job = runFrameJob(openWorkshop(studio.db, { renderFrame: endless, stops }), await jobOf(id));
    await started;
    await cancelVersion(studio.as.producer, { version: id });
    expect(await job).toBe("done");
    expect((await renderOf(id)).state).toBe("cancelled");
    ending.abort();
    await listening;
  });

  it("is put back for later when the worker closes mid-frame", async () => {
    const id = await begin();
    const stops = makeCancellations();
    const closing: Workshop["renderFrame"] = async (_setup, { signal }) => {
      stops.close();
      signal?.throwIfAborted();
      throw new Error("not reached");
    };
    const job = await jobOf(id);
    expect(await runFrameJob(openWorkshop(studio.db, { renderFrame: closing, stops }), job)).toBe("later");
    expect((await renderOf(id)).state).toBe("rendering");
  });
});

describe("looking after renders", () => {
  const neverPending = { isPending: () => Promise.resolve(false) };

  it("says that a render has stopped when the queue no longer knows its work", async () => {
    const id = await begin();
    await studio.db
      .update(outbox)
      .set({ doneAt: new Date() })
      .where(like(outbox.key, `job ${id}%`));
    await mendRenders(studio.db, neverPending, 0);
    expect(await renderOf(id)).toMatchObject({ state: "failed", failedFrame: 1001 });
  });

  it("leaves alone what still waits in the outbox or in the queue", async () => {
    const id = await begin();
    await mendRenders(studio.db, neverPending, 0);
    expect((await renderOf(id)).state).toBe("rendering");
    await studio.db
      .update(outbox)
      .set({ doneAt: new Date() })
      .where(like(outbox.key, `job ${id}%`));
    await mendRenders(studio.db, { isPending: () => Promise.resolve(true) }, 0);
    expect((await renderOf(id)).state).toBe("rendering");
  });

  it("seals a version whose frames are whole but which nobody sealed", async () => {
    const id = await begin();
    for (const frame of [1001, 1002]) {
      await studio.db
        .insert(frames)
        .values({ versionId: id, number: frame, milliseconds: 1, paths: 1, unresolved: 0 });
      for (const kind of ["png", "exr"] as const)
        await studio.db
          .insert(frameFiles)
          .values({ versionId: id, frame, kind, sha256: "b".repeat(64), bytes: 5 });
    }
    await mendRenders(studio.db, neverPending, 0);
    expect((await renderOf(id)).state).toBe("complete");
    expect(await sealVersion(studio.db, id)).toBe(true);
  });
});
