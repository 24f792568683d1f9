// Open pages that want to hear of changes: one listening connection for the whole process, and each page told only what
// its reader may know of.
import { and, eq, inArray, isNull } from "drizzle-orm";
import type { Database } from "@/db/client";
import { recipients } from "@/db/schema/deliveries";
import { people } from "@/db/schema/people";
import { may } from "../auth/authorize";
import { loadActor } from "../auth/load-actor";
import type { Actor, Ctx } from "../context";
import { log } from "../log";
import { listenForChanges, type Change } from "./listen";

export interface Subscriber {
  send(change: Change): void;
  /** The reader is no longer who they were: the stream ends, and the page asks anew. */
  end(): void;
}

interface Subscription extends Subscriber {
  actor: Actor;
  epoch: number;
}

export interface Subscriptions {
  subscribe(ctx: Ctx, subscriber: Subscriber): Promise<() => void>;
}

/** Changes after which what a reader may see has to be asked again. */
const changesReaders = (kind: string) => /^(person|password|production|invitation)\./.test(kind);

export function makeSubscriptions(db: Database, url: string): Subscriptions {
  const open = new Set<Subscription>();
  let stop: AbortController | undefined;

  const pass = async (change: Change) => {
    if (changesReaders(change.kind)) await refreshReaders(db, open);
    const clients = await clientsConcerned(db, open, change);
    for (const subscription of open) {
      if (maySee(subscription.actor, change)) subscription.send(change);
      // A client learns that something of theirs changed, and nothing about what else happens in the production.
      else if (clients.has(subscription.actor.id))
        subscription.send({ kind: "delivery", productionId: null });
    }
  };
  const start = () => {
    stop = new AbortController();
    // One after the other, so that pages hear of changes in their order.
    let last = Promise.resolve();
    const onChange = (change: Change) => {
      last = last
        .then(() => pass(change))
        .catch((error: unknown) => log.warn({ err: error, kind: change.kind }, "open pages were not told"));
    };
    void listenForChanges(url, { onChange }, stop.signal);
  };
  return {
    async subscribe({ actor }, subscriber) {
      const [person] = await db
        .select({ epoch: people.sessionEpoch })
        .from(people)
        .where(eq(people.id, actor.id));
      const subscription = { ...subscriber, actor, epoch: person?.epoch ?? 0 };
      open.add(subscription);
      if (!stop) start();
      return () => {
        open.delete(subscription);
        if (open.size > 0) return;
        stop?.abort();
        stop = undefined;
      };
    },
  };
}

const maySee = (actor: Actor, { productionId }: Change): boolean =>
  typeof productionId === "string"
    ? may(actor, "production.see", productionId)
    : may(actor, "studio.see", null);

async function refreshReaders(db: Database, open: Set<Subscription>): Promise<void> {
  for (const subscription of open) {
    const actor = await loadActor(db, subscription.actor.id, subscription.epoch);
    if (actor) subscription.actor = actor;
    else subscription.end();
  }
}

/** The subscribed people to whom the delivery that changed was published. */
async function clientsConcerned(db: Database, open: Set<Subscription>, change: Change): Promise<Set<string>> {
  if (typeof change.deliveryId !== "string" || open.size === 0) return new Set();
  const readers = [...new Set([...open].map(({ actor }) => actor.id))];
  const rows = await db
    .select({ id: recipients.personId })
    .from(recipients)
    .where(
      and(
        eq(recipients.deliveryId, change.deliveryId),
        inArray(recipients.personId, readers),
        isNull(recipients.revokedAt),
      ),
    );
  return new Set(rows.map(({ id }) => id));
}
