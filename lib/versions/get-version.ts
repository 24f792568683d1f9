import { asc, desc, eq, sql } from "drizzle-orm";
import { alias } from "drizzle-orm/pg-core";
import type { z } from "zod";
import type { Database } from "@/db/client";
import { events } from "@/db/schema/events";
import { people } from "@/db/schema/people";
import { productions } from "@/db/schema/productions";
import { submissions } from "@/db/schema/reviews";
import { shots } from "@/db/schema/shots";
import { frames, renders, seals, versions } from "@/db/schema/versions";
import { kernelVersion } from "@/render/kernel-version";
import type { Setup } from "@/render/scene/setup";
import { may } from "../auth/authorize";
import type { Action } from "../auth/policy";
import type { Actor, Ctx } from "../context";
import { found } from "../errors";
import { sentenceOf } from "../events/sentence";
import { describeSetup } from "../reviews/describe-setup";
import { runsOf } from "./frame-names";
import { findVersion, type VersionRow } from "./find-version";
import type { RenderFacts, versionIdInput, VersionPage } from "./schema";
import { readStandings } from "./version-facts";

const sender = alias(people, "sender");

/** A version as its page shows it. */
export async function getVersion(ctx: Ctx, input: z.infer<typeof versionIdInput>): Promise<VersionPage> {
  const { id, productionId, shotId } = await findVersion(ctx.db, ctx.actor, "version.see", input.version);
  const [row, finished, newest, standings, history] = await Promise.all([
    readRow(ctx.db, id),
    readFinished(ctx.db, id),
    readNewest(ctx.db, shotId),
    readStandings(ctx.db, eq(versions.id, id)),
    readHistory(ctx.db, productionId, id),
  ]);
  const { version, shot, production, maker, render, seal, sent, sentBy } = row;
  return {
    id,
    number: version.number,
    production,
    shot,
    standing: standings.get(id) ?? "stopped",
    newer: newest && newest.number > version.number ? newest : null,
    setup: JSON.parse(version.setup) as Setup,
    setupDigest: version.setupDigest,
    kernel: version.kernel,
    kernelHere: kernelVersion,
    quality: version.quality,
    colourSpace: version.colourSpace,
    channels: version.channels,
    first: version.first,
    last: version.last,
    maker,
    madeAt: version.madeAt.toISOString(),
    render: factsOf(render, finished),
    finished: runsOf(finished.map(({ number }) => number)),
    seal: seal && { digest: seal.digest, bytes: seal.bytes, sealedAt: seal.sealedAt.toISOString() },
    sent: sent && { at: sent.sentAt.toISOString(), by: sentBy?.name ?? "", words: sent.words },
    history,
    setupFacts: describeSetup(JSON.parse(version.setup) as Setup),
    viewer: viewerOf(ctx.actor, version),
  };
}

function viewerOf(actor: Actor, { productionId, madeBy, kernel }: VersionRow): VersionPage["viewer"] {
  const does = (action: Action) => may(actor, action, productionId);
  return {
    timeZone: actor.timeZone,
    role: actor.roles.get(productionId) ?? null,
    mayCancel: does("version.cancel"),
    mayResume: does("version.resume") && kernel === kernelVersion,
    maySend: does("review.send"),
    mayGiveVerdict: does("verdict.give") && madeBy !== actor.id,
    mayWithdraw: does("verdict.withdraw") && madeBy !== actor.id,
  };
}

async function readRow(db: Database, id: string) {
  const [row] = await db
    .select({
      version: versions,
      shot: { id: shots.id, code: shots.code, brief: shots.brief },
      production: { id: productions.id, name: productions.name },
      maker: { id: people.id, name: people.name },
      render: renders,
      seal: seals,
      sent: submissions,
      sentBy: { name: sender.name },
    })
    .from(versions)
    .innerJoin(shots, eq(shots.id, versions.shotId))
    .innerJoin(productions, eq(productions.id, versions.productionId))
    .innerJoin(people, eq(people.id, versions.madeBy))
    .innerJoin(renders, eq(renders.versionId, versions.id))
    .leftJoin(seals, eq(seals.versionId, versions.id))
    .leftJoin(submissions, eq(submissions.versionId, versions.id))
    .leftJoin(sender, eq(sender.id, submissions.sentBy))
    .where(eq(versions.id, id));
  return found(row, "version");
}

function readFinished(db: Database, id: string) {
  return db
    .select({ number: frames.number, milliseconds: frames.milliseconds, unresolved: frames.unresolved })
    .from(frames)
    .where(eq(frames.versionId, id))
    .orderBy(asc(frames.number));
}

async function readNewest(db: Database, shotId: string) {
  const [newest] = await db
    .select({ id: versions.id, number: versions.number })
    .from(versions)
    .where(eq(versions.shotId, shotId))
    .orderBy(desc(versions.number))
    .limit(1);
  return newest;
}

async function readHistory(db: Database, productionId: string, id: string) {
  const rows = await db
    .select()
    .from(events)
    .where(sql`${events.productionId} = ${productionId} and ${events.subject} ->> 'versionId' = ${id}`)
    .orderBy(asc(events.seq));
  return rows.map(({ at, kind, subject }) => ({ at: at.toISOString(), sentence: sentenceOf(kind, subject) }));
}

function factsOf(
  { state, attempt, failedFrame, failure, changedAt }: typeof renders.$inferSelect,
  finished: { milliseconds: number; unresolved: number }[],
): RenderFacts {
  const sum = (of: "milliseconds" | "unresolved") => finished.reduce((total, frame) => total + frame[of], 0);
  return {
    state,
    attempt,
    failedFrame,
    failure,
    changedAt: changedAt.toISOString(),
    milliseconds: sum("milliseconds"),
    unresolved: sum("unresolved"),
  };
}
