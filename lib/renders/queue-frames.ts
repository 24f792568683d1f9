import type { Transaction } from "@/db/client";
import { queueJobs } from "../queue/outbox";

// Few frames a job, so that little is done twice after a crash; few jobs a version, so that the queue stays short.
const framesPerJob = 4;
const mostJobs = 500;

/** Cuts frame numbers, which must rise, into runs without gaps of a bounded length. */
export function cutIntoRuns(numbers: number[]): { first: number; last: number }[] {
  const longest = Math.max(framesPerJob, Math.ceil(numbers.length / mostJobs));
  const runs: { first: number; last: number }[] = [];
  for (const number of numbers) {
    const run = runs.at(-1);
    if (run && number === run.last + 1 && number - run.first < longest) run.last = number;
    else runs.push({ first: number, last: number });
  }
  return runs;
}

/** Writes the jobs that render these frames into the outbox, for one attempt at the version. */
export async function queueFrames(
  tx: Transaction,
  versionId: string,
  attempt: number,
  numbers: number[],
): Promise<void> {
  const jobs = cutIntoRuns(numbers).map(({ first, last }) => ({
    key: `${versionId} ${attempt} ${first}-${last}`,
    payload: { versionId, attempt, first, last },
  }));
  await queueJobs(tx, jobs);
}
