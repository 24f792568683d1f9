// The queue of frames to render: kept in PostgreSQL, or in Redis when one is configured.
import {
  createPostgresBackend,
  Queue,
  WaitingError,
  withBackend,
  Worker,
  type Job,
  type WorkerOptions,
} from "bullmq";
import pg from "pg";
import type { FrameJob } from "../renders/schema";

const queueName = "frames";

/** Where the queue is. */
export interface QueuePlace {
  databaseUrl: string;
  redisUrl?: string;
}

/** What the relay and the mender need of the queue. */
export interface FrameQueue {
  /** Adds the job unless the queue already holds one of this id. */
  add(id: string, job: FrameJob): Promise<void>;
  /** Whether the job still waits or is being done. */
  isPending(id: string): Promise<boolean>;
  close(): Promise<void>;
}

export interface FrameWorker {
  /** Stops taking jobs, and waits for the one in hand. */
  close(): Promise<void>;
}

/** Does a job; "later" puts it back untouched, for whoever takes it next. */
export type Perform = (job: FrameJob) => Promise<"done" | "later">;
/** Called when the queue gives a job up for good, with its reason. */
export type GiveUp = (job: FrameJob, reason: string) => void;

// A fault of the moment (a restarted database, say) is tried again for about eight minutes before the job is given up.
const jobOptions = {
  attempts: 10,
  backoff: { type: "exponential", delay: 1000 },
  removeOnComplete: { age: 86_400, count: 10_000 },
  removeOnFail: { age: 7 * 86_400 },
};

// A killed worker's job is taken up again within two seconds (STACK, "BullMQ on PostgreSQL"). A stall uses no attempt.
const workerOptions = { concurrency: 1, lockDuration: 2000, stalledInterval: 1000, maxStalledCount: 3 };

const postgres = withBackend(createPostgresBackend);

// The backend takes a pool rather than an address, and then expects the pool to look into the queue's own schema.
const openPool = (connectionString: string) => {
  const pool = new pg.Pool({ connectionString, max: 4, options: "-c search_path=bullmq", keepAlive: true });
  pool.on("error", () => undefined);
  return pool;
};

export function openFrameQueue({ databaseUrl, redisUrl }: QueuePlace): FrameQueue {
  const pool = redisUrl ? undefined : openPool(databaseUrl);
  const queue = pool
    ? new postgres.Queue<FrameJob>(queueName, { connection: pool })
    : new Queue<FrameJob>(queueName, { connection: { url: redisUrl, maxRetriesPerRequest: null } });
  queue.on("error", () => undefined);
  return {
    add: async (id, job) => {
      await queue.add("frames", job, { ...jobOptions, jobId: id });
    },
    isPending: async (id) => pendingStates.has(await queue.getJobState(id)),
    close: async () => {
      await queue.close();
      await pool?.end();
    },
  };
}

const pendingStates = new Set<string>(["waiting", "active", "delayed", "prioritized", "waiting-children"]);

export function startFrameWorker(place: QueuePlace, perform: Perform, giveUp: GiveUp): FrameWorker {
  const pool = place.redisUrl ? undefined : openPool(place.databaseUrl);
  const process = async (job: Job<FrameJob>, token?: string) => {
    if ((await perform(job.data)) === "done") return;
    await job.moveToWait(token);
    throw new WaitingError();
  };
  const worker = pool
    ? new postgres.Worker<FrameJob>(queueName, process, { ...workerOptions, connection: pool })
    : new Worker<FrameJob>(queueName, process, { ...workerOptions, connection: redisOf(place.redisUrl) });
  worker.on("error", () => undefined);
  worker.on("failed", (job: Job<FrameJob> | undefined, error: Error) => {
    const over = job && (job.finishedOn !== undefined || job.attemptsMade >= jobOptions.attempts);
    if (over) giveUp(job.data, error.message);
  });
  return {
    close: async () => {
      await worker.close();
      await pool?.end();
    },
  };
}

const redisOf = (url: string | undefined): WorkerOptions["connection"] => ({
  url,
  maxRetriesPerRequest: null,
});
