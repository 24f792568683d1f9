import { performance } from "node:perf_hooks";

/**
 * Does one step and says, when it is done, what is now true and how long it took.
 * @template T
 * @param {string} done a sentence without its full stop
 * @param {() => Promise<T>} work
 * @param {string} [before] said first, where the wait would otherwise be unexplained
 * @returns {Promise<T>}
 */
export async function step(done, work, before) {
  if (before) console.log(before);
  const began = performance.now();
  const result = await work();
  console.log(`${done} (${formatSeconds(performance.now() - began)}).`);
  return result;
}

/** @param {number} milliseconds */
export const formatSeconds = (milliseconds) => `${(milliseconds / 1000).toFixed(1)} s`;
