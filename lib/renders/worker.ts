// The worker process: hands the outbox on to the queue and to the mail server, and renders frames until it is told to stop.
import { renderFrame } from "@/render/hosts/node/render-frame";
import { database } from "../database";
import { environment } from "../environment";
import { log } from "../log";
import { startMailRelay } from "../mail/relay";
import { openFrameQueue, startFrameWorker } from "../queue/frame-queue";
import { startJobRelay } from "../queue/relay";
import { sweepIncoming } from "../storage/folder";
import { storage } from "../storage/storage";
import { makeCancellations } from "./cancellations";
import { failRender } from "./fail-render";
import { mendRenders } from "./mend-renders";
import { runFrameJob } from "./run-frame-job";
import type { FrameJob } from "./schema";

const { DATABASE_URL: databaseUrl, REDIS_URL: redisUrl, STORAGE_DIR, S3_BUCKET } = environment();
const db = database();
const queue = openFrameQueue({ databaseUrl, redisUrl });
const stops = makeCancellations();
const ending = new AbortController();

if (!S3_BUCKET) await sweepIncoming(STORAGE_DIR, Date.now());

const giveUp = ({ versionId, attempt, first }: FrameJob, reason: string) => {
  const why = `The worker tried these frames again and again and gave them up: ${reason}. Resume when the cause is gone.`;
  failRender(db, { versionId, attempt, frame: first, why }).catch((error: unknown) =>
    log.error({ err: error }),
  );
};
const shop = { db, store: storage(), renderFrame, stops };
const worker = startFrameWorker({ databaseUrl, redisUrl }, (job) => runFrameJob(shop, job), giveUp);

const mending = setInterval(() => {
  mendRenders(db, queue).catch((error: unknown) =>
    log.warn({ err: error }, "renders could not be looked after"),
  );
}, 30_000);

const tasks = [
  startJobRelay(db, databaseUrl, queue, ending.signal),
  startMailRelay(db, ending.signal),
  stops.listen(db, databaseUrl, ending.signal),
];

async function stop(): Promise<void> {
  log.info("the worker is stopping");
  clearInterval(mending);
  // First no new job is taken, then the one in hand is put back.
  const closed = worker.close();
  stops.close();
  ending.abort();
  await Promise.allSettled([closed, ...tasks]);
  await queue.close();
  await db.$client.end();
  process.exit(0);
}

for (const signal of ["SIGTERM", "SIGINT"] as const) process.once(signal, () => void stop());
log.info({ pid: process.pid }, "the worker is ready");
