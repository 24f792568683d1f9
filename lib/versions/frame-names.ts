/** A run of frames in words: "frame 1001", or "frames 1001–1024". */
export function nameFrames(first: number, last: number): string {
  return first === last ? `frame ${first}` : `frames ${first}–${last}`;
}
