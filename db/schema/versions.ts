import { sql } from "drizzle-orm";
import {
  bigint,
  check,
  foreignKey,
  integer,
  pgTable,
  primaryKey,
  text,
  unique,
  uuid,
} from "drizzle-orm/pg-core";
import { colourSpaces, fileKinds, qualities, renderStates } from "../enums";
import { at, id, now, sha256 } from "./columns";
import { people } from "./people";
import { shots } from "./shots";

/** A numbered, frozen copy of the setup. Insert-only: a trigger refuses UPDATE and DELETE. */
export const versions = pgTable(
  "versions",
  {
    id: id(),
    productionId: uuid("production_id").notNull(),
    shotId: uuid("shot_id").notNull(),
    number: integer("number").notNull(),
    /** Canonical JSON of the setup, exactly the bytes that were hashed. */
    setup: text("setup").notNull(),
    setupDigest: sha256("setup_digest").notNull(),
    kernel: text("kernel").notNull(),
    quality: text("quality", { enum: qualities }).notNull(),
    colourSpace: text("colour_space", { enum: colourSpaces }).notNull(),
    channels: text("channels").notNull(),
    first: integer("first").notNull(),
    last: integer("last").notNull(),
    madeBy: uuid("made_by")
      .notNull()
      .references(() => people.id),
    madeAt: now("made_at"),
  },
  (table) => [
    unique("versions_number").on(table.shotId, table.number),
    unique("versions_in_production").on(table.id, table.productionId),
    foreignKey({
      columns: [table.shotId, table.productionId],
      foreignColumns: [shots.id, shots.productionId],
    }),
    check("versions_range", sql`${table.first} >= 0 and ${table.last} >= ${table.first}`),
    check(
      "versions_setup_digest",
      sql`${table.setupDigest} = encode(sha256(convert_to(${table.setup}, 'UTF8')), 'hex')`,
    ),
    check("versions_quality", sql`${table.quality} in ('proof', 'master')`),
    check("versions_colour", sql`${table.colourSpace} in ('rec709', 'acescg')`),
  ],
);

/** How a version's rendering stands. The one changing row beside a version that never changes. */
export const renders = pgTable(
  "renders",
  {
    versionId: uuid("version_id")
      .primaryKey()
      .references(() => versions.id),
    state: text("state", { enum: renderStates }).notNull().default("rendering"),
    /** Raised by each resume; jobs of an earlier attempt do nothing. */
    attempt: integer("attempt").notNull().default(1),
    failedFrame: integer("failed_frame"),
    failure: text("failure"),
    changedAt: now("changed_at"),
    finishedAt: at("finished_at"),
  },
  (table) => [
    check("renders_state", sql`${table.state} in ('rendering', 'failed', 'cancelled', 'complete')`),
  ],
);

/** A finished frame. Insert-only, refused outside the version's range and once the version is sealed. */
export const frames = pgTable(
  "frames",
  {
    versionId: uuid("version_id")
      .notNull()
      .references(() => versions.id),
    number: integer("number").notNull(),
    milliseconds: integer("milliseconds").notNull(),
    paths: bigint("paths", { mode: "number" }).notNull(),
    unresolved: integer("unresolved").notNull(),
    finishedAt: now("finished_at"),
  },
  (table) => [primaryKey({ columns: [table.versionId, table.number] })],
);

export const frameFiles = pgTable(
  "frame_files",
  {
    versionId: uuid("version_id").notNull(),
    frame: integer("frame").notNull(),
    kind: text("kind", { enum: fileKinds }).notNull(),
    sha256: sha256("sha256").notNull(),
    bytes: bigint("bytes", { mode: "number" }).notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.versionId, table.frame, table.kind] }),
    unique("frame_files_exact").on(table.versionId, table.frame, table.kind, table.sha256),
    foreignKey({
      columns: [table.versionId, table.frame],
      foreignColumns: [frames.versionId, frames.number],
    }),
    check("frame_files_kind", sql`${table.kind} in ('png', 'exr')`),
  ],
);

/** The digest of a whole version. Insert-only; the database recomputes it and refuses any other. */
export const seals = pgTable(
  "seals",
  {
    versionId: uuid("version_id")
      .primaryKey()
      .references(() => versions.id),
    digest: sha256("digest").notNull(),
    frameCount: integer("frame_count").notNull(),
    bytes: bigint("bytes", { mode: "number" }).notNull(),
    sealedAt: now("sealed_at"),
  },
  (table) => [unique("seals_exact").on(table.versionId, table.digest)],
);
