import { and, between, eq, inArray, sql } from "drizzle-orm";
import { alias } from "drizzle-orm/pg-core";
import type { Database, Transaction } from "@/db/client";
import { people } from "@/db/schema/people";
import { verdicts } from "@/db/schema/reviews";
import { shots } from "@/db/schema/shots";
import { frameFiles, seals, versions } from "@/db/schema/versions";
import { DomainError } from "../errors";
import { findRuns } from "../reviews/find-verdicts";
import { framePath } from "./lay-out";
import type { MeasureDelivery } from "./schema";

const maker = alias(people, "maker");

type Choice = MeasureDelivery["items"][number];

/** The chosen runs, each proved to stand signed off by the verdict it names, with its files under their delivered names. */
export async function planDelivery(db: Database | Transaction, input: MeasureDelivery) {
  const found = await findChosen(db, input);
  const items = [];
  for (const choice of input.items) {
    const version = found.get(choice.verdict);
    if (!version || version.versionId !== choice.version)
      throw new DomainError(
        "not-found",
        "One of the versions is not in this production, or was never signed off.",
        "items",
      );
    await refuseUnsigned(db, choice, version);
    const { first, last } = choice;
    if (String(last).length > input.digits)
      throw new DomainError(
        "invalid",
        `Frame ${last} needs ${String(last).length} figures in its name.`,
        "digits",
      );
    const item = { ...version, first, last };
    items.push({ ...item, files: await findFiles(db, item, input) });
  }
  return items.sort((a, b) => (a.shotCode < b.shotCode ? -1 : 1));
}

export type PlannedItem = Awaited<ReturnType<typeof planDelivery>>[number];

async function findChosen(db: Database | Transaction, input: MeasureDelivery) {
  const rows = await db
    .select({
      verdictId: verdicts.id,
      versionId: versions.id,
      shotId: shots.id,
      shotCode: shots.code,
      number: versions.number,
      versionFirst: versions.first,
      versionLast: versions.last,
      setup: versions.setup,
      setupDigest: versions.setupDigest,
      kernel: versions.kernel,
      quality: versions.quality,
      colourSpace: versions.colourSpace,
      digest: seals.digest,
      maker: maker.name,
      advisor: people.name,
      advisorWords: verdicts.words,
      signedAt: verdicts.givenAt,
      manifest: sql<string>`version_manifest(${versions.id})`,
    })
    .from(verdicts)
    .innerJoin(versions, eq(versions.id, verdicts.versionId))
    .innerJoin(seals, eq(seals.versionId, versions.id))
    .innerJoin(shots, eq(shots.id, versions.shotId))
    .innerJoin(maker, eq(maker.id, versions.madeBy))
    .innerJoin(people, eq(people.id, verdicts.givenBy))
    .where(
      and(
        eq(versions.productionId, input.production),
        inArray(
          verdicts.id,
          input.items.map(({ verdict }) => verdict),
        ),
      ),
    );
  return new Map(rows.map((row) => [row.verdictId, row]));
}

async function refuseUnsigned(
  db: Database | Transaction,
  { version, verdict, first, last }: Choice,
  { shotCode, number }: { shotCode: string; number: number },
): Promise<void> {
  const runs = await findRuns(db, version);
  const stands = runs.some(
    (run) =>
      run.verdictId === verdict &&
      run.kind === "signed off" &&
      run.first <= first &&
      run.last >= last &&
      first <= last,
  );
  if (!stands)
    throw new DomainError(
      "conflict",
      `Frames ${first} to ${last} of version ${number} of ${shotCode} do not all stand signed off by the verdict that was chosen. Load the page again.`,
      "items",
    );
}

async function findFiles(
  db: Database | Transaction,
  item: { versionId: string; shotCode: string; number: number; first: number; last: number },
  input: MeasureDelivery,
) {
  const rows = await db
    .select({
      frame: frameFiles.frame,
      kind: frameFiles.kind,
      sha256: frameFiles.sha256,
      bytes: frameFiles.bytes,
    })
    .from(frameFiles)
    .where(
      and(
        eq(frameFiles.versionId, item.versionId),
        between(frameFiles.frame, item.first, item.last),
        inArray(frameFiles.kind, input.formats),
      ),
    )
    .orderBy(frameFiles.frame, frameFiles.kind);
  return rows.map((row) => ({ ...row, path: framePath(item, row.frame, row.kind, input) }));
}
