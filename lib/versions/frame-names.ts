/** A run of frames in words: "frame 1001", or "frames 1001–1024". */
export function nameFrames(first: number, last: number): string {
  return first === last ? `frame ${first}` : `frames ${first}–${last}`;
}

/** Rising frame numbers as runs without gaps. */
export function runsOf(numbers: number[]): { first: number; last: number }[] {
  const runs: { first: number; last: number }[] = [];
  for (const number of numbers) {
    const run = runs.at(-1);
    if (run && number === run.last + 1) run.last = number;
    else runs.push({ first: number, last: number });
  }
  return runs;
}

/** What a version's files are called before the frame number, as LH-020_v004. */
export const fileStem = (shotCode: string, number: number): string =>
  `${shotCode}_v${String(number).padStart(3, "0")}`;
