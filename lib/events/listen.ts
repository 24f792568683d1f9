// Hearing what other processes committed: one connection that listens, and comes back when it is lost.
import { setTimeout as wait } from "node:timers/promises";
import pg from "pg";
import { log } from "../log";
import { changesChannel } from "./record";

export interface Change {
  productionId: string | null;
  kind: string;
  [name: string]: string | number | null;
}

export interface ChangeListener {
  onChange(change: Change): void;
  /** Called whenever the connection is there, the first time included: what came before may have been missed. */
  onConnect?(): void;
}

/** Listens until the signal ends it; resolves then. */
export async function listenForChanges(
  url: string,
  listener: ChangeListener,
  signal: AbortSignal,
): Promise<void> {
  for (let failures = 0; !signal.aborted; failures += 1) {
    try {
      await listenOnce(
        url,
        { ...listener, onConnect: () => ((failures = 0), listener.onConnect?.()) },
        signal,
      );
    } catch (error) {
      log.warn({ err: error }, "lost the connection that listens for changes");
    }
    if (!signal.aborted) await pause(Math.min(5000, 100 * 2 ** failures), signal);
  }
}

async function listenOnce(url: string, listener: ChangeListener, signal: AbortSignal): Promise<void> {
  const client = new pg.Client({
    connectionString: url,
    keepAlive: true,
    application_name: "ringwright changes",
  });
  let stop = () => {};
  const ended = new Promise<void>((resolve, reject) => {
    client.on("error", reject);
    client.on("end", () => resolve());
    stop = () => resolve();
    signal.addEventListener("abort", stop, { once: true });
  });
  ended.catch(() => undefined);
  client.on("notification", ({ payload }) => listener.onChange(JSON.parse(payload ?? "{}") as Change));
  try {
    await client.connect();
    await client.query(`listen ${changesChannel}`);
    listener.onConnect?.();
    await ended;
  } finally {
    signal.removeEventListener("abort", stop);
    client.removeAllListeners("error").on("error", () => undefined);
    await client.end().catch(() => undefined);
  }
}

async function pause(milliseconds: number, signal: AbortSignal): Promise<void> {
  await wait(milliseconds, undefined, { signal }).catch(() => undefined);
}
