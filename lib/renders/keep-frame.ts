import { and, eq, sql } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import type { FileKind } from "@/db/enums";
import { frameFiles, frames, renders } from "@/db/schema/versions";
import type { RenderedFrame } from "@/render/hosts/node/frame-request";
import { announce } from "../events/record";
import type { Storage, StoredFile } from "../storage/stored-file";
import { FrameFailure, storageFailure } from "./frame-failure";
import type { FramePlan } from "./frame-plan";

/** Whether the frame is finished: its row is there and storage still holds the bytes the row names. */
export async function isFrameKept(
  db: Database,
  store: Storage,
  versionId: string,
  frame: number,
): Promise<boolean> {
  const files = await db
    .select()
    .from(frameFiles)
    .where(and(eq(frameFiles.versionId, versionId), eq(frameFiles.frame, frame)));
  if (files.length < 2) return false;
  for (const { sha256 } of files) if (!(await store.verify(sha256))) return false;
  return true;
}

/** Puts a frame's files into storage, then its rows, all at once, into the database. Doing so again changes nothing. */
export async function keepFrame(
  db: Database,
  store: Storage,
  plan: FramePlan,
  frame: number,
  rendered: RenderedFrame,
): Promise<void> {
  const files = await putFiles(store, rendered);
  await db.transaction(async (tx) => {
    const [current] = await tx
      .select()
      .from(renders)
      .where(
        and(
          eq(renders.versionId, plan.versionId),
          eq(renders.attempt, plan.attempt),
          eq(renders.state, "rendering"),
        ),
      )
      .for("share");
    if (!current) return;

    const { seconds, paths, unresolved } = rendered.stats;
    const milliseconds = Math.round(seconds * 1000);
    const inserted = await tx
      .insert(frames)
      .values({ versionId: plan.versionId, number: frame, milliseconds, paths, unresolved })
      .onConflictDoNothing()
      .returning({ number: frames.number });
    const rows = files.map((file) => ({ versionId: plan.versionId, frame, ...file }));
    if (inserted.length > 0) await tx.insert(frameFiles).values(rows);
    else await compareFiles(tx, plan.versionId, frame, files);
    await announceProgress(tx, plan, frame);
  });
}

type KindedFile = StoredFile & { kind: FileKind };

async function putFiles(store: Storage, { png, exr }: RenderedFrame): Promise<KindedFile[]> {
  try {
    return [
      { kind: "exr", ...(await store.put(exr)) },
      { kind: "png", ...(await store.put(png)) },
    ];
  } catch (error) {
    throw storageFailure(error);
  }
}

/** A frame that was finished before must come out the same again, or the build does not keep its promise. */
async function compareFiles(
  tx: Transaction,
  versionId: string,
  frame: number,
  files: KindedFile[],
): Promise<void> {
  const kept = await tx
    .select()
    .from(frameFiles)
    .where(and(eq(frameFiles.versionId, versionId), eq(frameFiles.frame, frame)));
  const differs = files.find(
    ({ kind, sha256 }) => !kept.some((row) => row.kind === kind && row.sha256 === sha256),
  );
  if (!differs) return;
  throw new FrameFailure(
    `Rendered again, the frame's ${differs.kind.toUpperCase()} came out with other bytes than those already kept. ` +
      "Nothing was replaced. Tell whoever looks after the workers: two builds or two machines disagree.",
  );
}

async function announceProgress(tx: Transaction, plan: FramePlan, frame: number): Promise<void> {
  const [count] = await tx
    .select({ done: sql<number>`count(*)::int` })
    .from(frames)
    .where(eq(frames.versionId, plan.versionId));
  const { productionId, versionId, shotId, first, last } = plan;
  const subject = { productionId, versionId, shotId, frame, done: count!.done, of: last - first + 1 };
  await announce(tx, { kind: "frame.finished", ...subject });
}
