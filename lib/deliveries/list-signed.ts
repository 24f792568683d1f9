import { and, eq, inArray, isNull, sql } from "drizzle-orm";
import type { z } from "zod";
import { deliveries, deliveryItems } from "@/db/schema/deliveries";
import { productions } from "@/db/schema/productions";
import { standingVerdicts, verdicts } from "@/db/schema/reviews";
import { shots } from "@/db/schema/shots";
import { frameFiles, seals, versions } from "@/db/schema/versions";
import { authorize } from "../auth/authorize";
import type { Ctx } from "../context";
import { found } from "../errors";
import { productionIdSchema } from "./schema";

/** What can be delivered: for each version, every run of frames that one sign-off stands on, with its files' sizes. */
export async function listSigned(ctx: Ctx, input: z.infer<typeof productionIdSchema>) {
  authorize(ctx.actor, "delivery.make", input.production);
  const { name, kind } = productions;
  const [row] = await ctx.db
    .select({ name, kind })
    .from(productions)
    .where(eq(productions.id, input.production));
  const runs = await findSignedRuns(ctx, input.production);
  const earlier = await findEarlier(
    ctx,
    runs.map(({ version }) => version),
  );
  return {
    production: { id: input.production, ...found(row, "production") },
    runs: runs.map((run) => ({
      ...run,
      deliveredIn: earlier.filter(({ version }) => version === run.version).map((d) => d.number),
    })),
  };
}

export type SignedRuns = Awaited<ReturnType<typeof listSigned>>;
export type SignedRun = SignedRuns["runs"][number];

const bytesOf = (kind: "png" | "exr") =>
  sql<number>`coalesce(sum(${frameFiles.bytes}) filter (where ${frameFiles.kind} = ${kind}), 0)::float8`;

// Consecutive frames under one verdict share (frame − rank among that verdict's frames).
async function findSignedRuns(ctx: Ctx, productionId: string) {
  const standing = ctx.db
    .select({
      versionId: standingVerdicts.versionId,
      verdictId: standingVerdicts.verdictId,
      frame: standingVerdicts.frame,
      run: sql<number>`${standingVerdicts.frame} - row_number() over (partition by ${standingVerdicts.verdictId} order by ${standingVerdicts.frame})`.as(
        "run",
      ),
    })
    .from(standingVerdicts)
    .innerJoin(versions, eq(versions.id, standingVerdicts.versionId))
    .where(and(eq(versions.productionId, productionId), eq(standingVerdicts.kind, "signed off")))
    .as("standing");
  return ctx.db
    .select({
      version: standing.versionId,
      verdict: standing.verdictId,
      shotCode: shots.code,
      number: versions.number,
      quality: versions.quality,
      digest: seals.digest,
      newest: sql<number>`(select max(w.number)::int from ${versions} w where w.shot_id = ${shots.id})`,
      first: sql<number>`min(${standing.frame})::int`,
      last: sql<number>`max(${standing.frame})::int`,
      pngBytes: bytesOf("png"),
      exrBytes: bytesOf("exr"),
    })
    .from(standing)
    .innerJoin(versions, eq(versions.id, standing.versionId))
    .innerJoin(verdicts, eq(verdicts.id, standing.verdictId))
    .innerJoin(seals, eq(seals.versionId, versions.id))
    .innerJoin(shots, eq(shots.id, versions.shotId))
    .innerJoin(
      frameFiles,
      and(eq(frameFiles.versionId, standing.versionId), eq(frameFiles.frame, standing.frame)),
    )
    .groupBy(standing.versionId, standing.verdictId, standing.run, shots.id, versions.id, seals.digest)
    .orderBy(shots.code, sql`${versions.number} desc`, sql`min(${standing.frame})`);
}

async function findEarlier(ctx: Ctx, versionIds: string[]) {
  if (versionIds.length === 0) return [];
  return ctx.db
    .select({ version: deliveryItems.versionId, number: deliveries.number })
    .from(deliveryItems)
    .innerJoin(deliveries, eq(deliveries.id, deliveryItems.deliveryId))
    .where(and(inArray(deliveryItems.versionId, versionIds), isNull(deliveries.withdrawnAt)))
    .orderBy(deliveries.number);
}
