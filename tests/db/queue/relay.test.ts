import { eq, like } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { outbox } from "@/db/schema/events";
import { openFrameQueue, startFrameWorker, type FrameQueue } from "@/lib/queue/frame-queue";
import { queueJobs } from "@/lib/queue/outbox";
import { relayJobs, startJobRelay } from "@/lib/queue/relay";
import type { FrameJob } from "@/lib/renders/schema";
import { openStudio, type Studio } from "../../support/studio";

let studio: Studio;
let queue: FrameQueue;
beforeAll(async () => {
  studio = await openStudio();
  queue = openFrameQueue({ databaseUrl: studio.url });
});
afterAll(async () => {
  await queue.close();
  await studio.close();
});

const job = (frame: number): FrameJob => ({
  versionId: "00000000-0000-4000-8000-000000000000",
  attempt: 1,
  first: frame,
  last: frame,
});

const put = (key: string, frame: number) =>
  studio.db.transaction((tx) => queueJobs(tx, [{ key, payload: job(frame) }]));

/** Runs a worker until it has done this many jobs, and a moment longer, and says which. */
async function work(wanted: number): Promise<number[]> {
  const done: number[] = [];
  let enough = () => {};
  const reached = new Promise<void>((resolve) => (enough = resolve));
  const worker = startFrameWorker(
    { databaseUrl: studio.url },
    async ({ first }) => {
      done.push(first);
      if (done.length >= wanted) enough();
      return "done";
    },
    () => undefined,
  );
  await reached;
  await worker.close();
  return done;
}

describe("the relay from the outbox to the queue", () => {
  it("hands each job over once, though several relays run and one hands over twice", async () => {
    for (const frame of [1, 2, 3, 4, 5]) await put(`once ${frame}`, frame);
    const taken = await Promise.all([relayJobs(studio.db, queue), relayJobs(studio.db, queue)]);
    expect(taken.reduce((sum, count) => sum + count)).toBe(5);
    // As after a crash between handing over and marking.
    await studio.db.update(outbox).set({ doneAt: null }).where(like(outbox.key, "job once%"));
    await relayJobs(studio.db, queue);
    await put("last of once", 99);
    await relayJobs(studio.db, queue);
    expect(await work(6)).toEqual([1, 2, 3, 4, 5, 99]);
  });

  it("hands over nothing that was rolled back", async () => {
    const undone = studio.db.transaction(async (tx) => {
      await queueJobs(tx, [{ key: "undone", payload: job(7) }]);
      throw new Error("never mind");
    });
    await expect(undone).rejects.toThrow("never mind");
    expect(await relayJobs(studio.db, queue)).toBe(0);
  });

  it("keeps a job the queue did not take, says why, and offers it again later", async () => {
    await put("offered", 8);
    await relayJobs(studio.db, { add: () => Promise.reject(new Error("the queue is away")) });
    const [row] = await studio.db.select().from(outbox).where(eq(outbox.key, "job offered"));
    expect(row).toMatchObject({ doneAt: null, attempts: 1, lastError: "the queue is away" });
    expect(row!.dueAt.getTime()).toBeGreaterThan(row!.createdAt.getTime());
    expect(await relayJobs(studio.db, queue)).toBe(0);
    await studio.db.update(outbox).set({ dueAt: row!.createdAt }).where(eq(outbox.id, row!.id));
    expect(await relayJobs(studio.db, queue)).toBe(1);
    expect(await work(1)).toEqual([8]);
  });

  it("wakes by itself once something is committed, and ends when it is told to", async () => {
    const ending = new AbortController();
    const relaying = startJobRelay(studio.db, studio.url, queue, ending.signal);
    await put("woken", 9);
    expect(await work(1)).toEqual([9]);
    ending.abort();
    await relaying;
  });

  it("knows whether a job still waits", async () => {
    await queue.add("job waits", job(10));
    expect(await queue.isPending("job waits")).toBe(true);
    expect(await queue.isPending("job never seen")).toBe(false);
    expect(await work(1)).toEqual([10]);
    expect(await queue.isPending("job waits")).toBe(false);
  });

  it("gives a job that was put back to the next worker, untouched", async () => {
    await queue.add("job put back", job(11));
    let asked = 0;
    let offered = () => {};
    const first = new Promise<void>((resolve) => (offered = resolve));
    const place = { databaseUrl: studio.url };
    const leaving = startFrameWorker(
      place,
      async () => {
        asked += 1;
        offered();
        return "later";
      },
      () => undefined,
    );
    await first;
    await leaving.close();
    expect(asked).toBeGreaterThan(0);
    expect(await work(1)).toEqual([11]);
  });
});
