// A render must never wait for work that no longer exists: a queue that was lost, or a job given up while nobody listened.
import { and, eq, isNull, like, sql } from "drizzle-orm";
import type { Database } from "@/db/client";
import { outbox } from "@/db/schema/events";
import { frames, renders } from "@/db/schema/versions";
import type { FrameQueue } from "../queue/frame-queue";
import { failRender } from "./fail-render";
import { frameJobSchema } from "./schema";
import { sealVersion } from "./seal-version";

const quietSeconds = 60;

/** Looks at each render that has been quiet for a minute: whole ones are sealed, ones without work are said to have stopped. */
export async function mendRenders(
  db: Database,
  queue: Pick<FrameQueue, "isPending">,
  quiet = quietSeconds,
): Promise<void> {
  const suspects = await db
    .select({ versionId: renders.versionId, attempt: renders.attempt })
    .from(renders)
    .where(
      and(
        eq(renders.state, "rendering"),
        sql`greatest(${renders.changedAt}, (select max(f.finished_at) from ${frames} f where f.version_id = ${renders.versionId}))
            <= now() - make_interval(secs => ${quiet})`,
      ),
    );
  for (const suspect of suspects) await mendOne(db, queue, suspect);
}

async function mendOne(
  db: Database,
  queue: Pick<FrameQueue, "isPending">,
  { versionId, attempt }: { versionId: string; attempt: number },
): Promise<void> {
  if (await sealVersion(db, versionId)) return;
  const ofAttempt = like(outbox.key, `job ${versionId} ${attempt} %`);
  const unsent = await db.$count(outbox, and(ofAttempt, isNull(outbox.doneAt)));
  if (unsent > 0) return;

  const kept = await db.select({ number: frames.number }).from(frames).where(eq(frames.versionId, versionId));
  const finished = new Set(kept.map(({ number }) => number));
  let firstMissing: number | undefined;
  for (const { key, payload } of await db.select().from(outbox).where(ofAttempt)) {
    const { first, last } = frameJobSchema.parse(payload);
    for (let frame = first; frame <= last; frame += 1)
      if (!finished.has(frame)) firstMissing = Math.min(firstMissing ?? frame, frame);
    if (firstMissing !== undefined && (await queue.isPending(key))) return;
  }
  if (firstMissing === undefined) return;
  const why = "The render queue no longer knows of this work. Resume the version to queue it again.";
  await failRender(db, { versionId, attempt, frame: firstMissing, why });
}
