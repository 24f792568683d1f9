// Which frames the command line is asked for.
import type { Setup } from "../../scene/setup";
import { Refusal } from "./refusal";

/** "1001-1024" or "1001", inclusive, within the setup's own range; all of it when nothing is said. */
export function frameRange(asked: string | undefined, { first, last }: Setup["time"]): number[] {
  const [from, to] = asked === undefined ? [first, last] : parseRange(asked);
  if (from < first || to > last)
    throw new Refusal([
      `--frames ${asked}: The setup has the frames ${first} to ${last}. Ask for some of those.`,
    ]);
  return Array.from({ length: to - from + 1 }, (_, i) => from + i);
}

function parseRange(asked: string): [number, number] {
  const match = /^(\d{1,6})(?:-(\d{1,6}))?$/.exec(asked);
  const [from, to] = [Number(match?.[1]), Number(match?.[2] ?? match?.[1])];
  if (!match || to < from)
    throw new Refusal([`--frames ${asked}: Give one frame, such as 1001, or a range, such as 1001-1024.`]);
  return [from, to];
}
