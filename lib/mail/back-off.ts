const firstSeconds = 5;
const longestSeconds = 60 * 60;

/** Seconds until a letter that failed this many times is tried again: 5, 10, 20, … up to an hour. It is never given up. */
export const backOffSeconds = (failures: number): number =>
  Math.min(longestSeconds, firstSeconds * 2 ** (Math.min(failures, 20) - 1));
