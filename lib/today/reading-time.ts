// How long reading takes, reckoned from what there is to read. The page states these measures.
export const minutesForFigures = 10;
export const secondsPerFrame = 4;
const wordsPerMinute = 200;

/** A version's setup and words, and every frame once, in whole minutes. */
export const minutesForVersion = (frames: number): number =>
  minutesForFigures + Math.ceil((frames * secondsPerFrame) / 60);

/** A text at 200 words a minute, and never less than a minute. */
export const minutesForWords = (text: string): number =>
  Math.max(1, Math.ceil(text.split(/\s+/).filter(Boolean).length / wordsPerMinute));
