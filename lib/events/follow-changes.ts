import type { Ctx } from "../context";
import { environment } from "../environment";
import { makeSubscriptions, type Subscriber, type Subscriptions } from "./subscriptions";

// Kept on the global object, as the database is: Next may evaluate a module once per bundle.
const holder = globalThis as typeof globalThis & { ringwrightSubscriptions?: Subscriptions };

/** Tells the subscriber of every change the actor may know of, until the returned function is called. */
export function followChanges(ctx: Ctx, subscriber: Subscriber): Promise<() => void> {
  holder.ringwrightSubscriptions ??= makeSubscriptions(ctx.db, environment().DATABASE_URL);
  return holder.ringwrightSubscriptions.subscribe(ctx, subscriber);
}
