// The shapes the review's pages are handed, as the verbs return them.
export type { DeclarationFacts } from "./get-declaration";
export type { QueueItem, ReviewQueue } from "./list-queue";
