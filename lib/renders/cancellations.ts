// Stopping a frame mid-way when its version is cancelled elsewhere, or when the worker is told to close.
import { and, inArray, ne } from "drizzle-orm";
import type { Database } from "@/db/client";
import { renders } from "@/db/schema/versions";
import { listenForChanges } from "../events/listen";
import { log } from "../log";

export interface StopWatch {
  /** A signal that aborts when the version is stopped ("stopped") or the worker closes ("closing"). */
  watch(versionId: string): { signal: AbortSignal; release(): void };
}

const stoppingKinds = new Set(["version.cancelled", "version.failed"]);

export interface Cancellations extends StopWatch {
  /** Aborts everything in hand, and from then on everything at once. */
  close(): void;
  /** Hears of stopped versions until the signal ends it. */
  listen(db: Database, url: string, signal: AbortSignal): Promise<void>;
}

export function makeCancellations(): Cancellations {
  const running = new Map<AbortController, string>();
  let closing = false;
  const stop = (versionId: string) => {
    for (const [controller, id] of running) if (id === versionId) controller.abort("stopped");
  };
  return {
    watch(versionId) {
      const controller = new AbortController();
      running.set(controller, versionId);
      if (closing) controller.abort("closing");
      return { signal: controller.signal, release: () => running.delete(controller) };
    },
    close() {
      closing = true;
      for (const controller of running.keys()) controller.abort("closing");
    },
    listen: (db, url, signal) =>
      listenForChanges(
        url,
        {
          onChange: (change) => {
            if (stoppingKinds.has(change.kind)) stop(String(change.versionId));
          },
          onConnect: () => void stopMissed(db, [...running.values()], stop),
        },
        signal,
      ),
  };
}

/** While the connection was away a cancellation may have gone unheard. */
async function stopMissed(db: Database, ids: string[], stop: (versionId: string) => void): Promise<void> {
  if (ids.length === 0) return;
  try {
    const stopped = await db
      .select({ id: renders.versionId })
      .from(renders)
      .where(and(inArray(renders.versionId, ids), ne(renders.state, "rendering")));
    for (const { id } of stopped) stop(id);
  } catch (error) {
    log.warn({ err: error }, "could not ask whether a version was cancelled; the next frame asks again");
  }
}
