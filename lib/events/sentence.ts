import { eventSentences, type EventKind } from "./kinds";

/** The sentence an event is read as. A kind this build does not know is shown by its own name rather than hidden. */
export function sentenceOf(kind: string, subject: Record<string, string | number>): string {
  if (!isKnown(kind)) return `${kind}.`;
  return eventSentences[kind](subject);
}

const isKnown = (kind: string): kind is EventKind => Object.hasOwn(eventSentences, kind);
