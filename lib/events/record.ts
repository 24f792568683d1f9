import { events } from "@/db/schema/events";
import type { Transaction } from "@/db/client";
import { sql } from "drizzle-orm";
import type { EventKind } from "./kinds";

export interface NewEvent {
  productionId: string | null;
  actorId: string | null;
  kind: EventKind;
  /** Ids of what it happened to, and the words its sentence needs, as they are now. */
  subject: Record<string, string | number>;
}

/** The channel on which every committed change is announced to open pages. */
export const changesChannel = "ringwright_changes";

/** Appends to the log within the caller's transaction, and tells open pages once that commits. */
export async function recordEvent(tx: Transaction, event: NewEvent): Promise<void> {
  await tx.insert(events).values(event);
  await announce(tx, { productionId: event.productionId, kind: event.kind, ...event.subject });
}

/**
 * Tells open pages that something moved, without a line in the log (progress of a render, say). Ids and numbers are told,
 * words are not: a notification holds 8,000 bytes at most, and pages read the words for themselves.
 */
export async function announce(
  tx: Pick<Transaction, "execute">,
  { kind, ...about }: { kind: string } & Record<string, string | number | null>,
): Promise<void> {
  const told = Object.entries(about).filter(
    ([name, value]) => name.endsWith("Id") || typeof value === "number",
  );
  const payload = JSON.stringify({ kind, ...Object.fromEntries(told) });
  await tx.execute(sql`select pg_notify(${changesChannel}, ${payload})`);
}
