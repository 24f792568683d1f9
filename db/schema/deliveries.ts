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
import { fileKinds, receiptKinds, verdictKinds } from "../enums";
import { at, id, now, sha256 } from "./columns";
import { people } from "./people";
import { productions } from "./productions";
import { verdicts } from "./reviews";
import { frameFiles, versions } from "./versions";

export const deliveries = pgTable(
  "deliveries",
  {
    id: id(),
    productionId: uuid("production_id")
      .notNull()
      .references(() => productions.id),
    number: integer("number").notNull(),
    title: text("title").notNull(),
    words: text("words").notNull().default(""),
    /** SHA-256 of the manifest: the digest a receipt is signed under. */
    manifestDigest: sha256("manifest_digest"),
    bytes: bigint("bytes", { mode: "number" }).notNull().default(0),
    madeBy: uuid("made_by")
      .notNull()
      .references(() => people.id),
    madeAt: now("made_at"),
    publishedAt: at("published_at"),
    publishedBy: uuid("published_by").references(() => people.id),
    withdrawnAt: at("withdrawn_at"),
    withdrawnWords: text("withdrawn_words"),
  },
  (table) => [
    unique("deliveries_number").on(table.productionId, table.number),
    unique("deliveries_in_production").on(table.id, table.productionId),
    check(
      "deliveries_published_whole",
      sql`${table.publishedAt} is null or ${table.manifestDigest} is not null`,
    ),
  ],
);

/** A run of signed frames in a delivery. The keys let it name nothing but a signed-off verdict of the same production. */
export const deliveryItems = pgTable(
  "delivery_items",
  {
    deliveryId: uuid("delivery_id").notNull(),
    productionId: uuid("production_id").notNull(),
    versionId: uuid("version_id").notNull(),
    verdictId: uuid("verdict_id").notNull(),
    digest: sha256("digest").notNull(),
    verdictKind: text("verdict_kind", { enum: verdictKinds }).notNull().default("signed off"),
    first: integer("first").notNull(),
    last: integer("last").notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.deliveryId, table.versionId] }),
    foreignKey({
      columns: [table.deliveryId, table.productionId],
      foreignColumns: [deliveries.id, deliveries.productionId],
    }),
    foreignKey({
      columns: [table.versionId, table.productionId],
      foreignColumns: [versions.id, versions.productionId],
    }),
    foreignKey({
      name: "delivery_items_signed_verdict",
      columns: [table.verdictId, table.versionId, table.digest, table.verdictKind],
      foreignColumns: [verdicts.id, verdicts.versionId, verdicts.digest, verdicts.kind],
    }),
    check("delivery_items_signed_only", sql`${table.verdictKind} = 'signed off'`),
  ],
);

/** Each delivered frame file: a new name for bytes that were signed, never new bytes. */
export const deliveryFiles = pgTable(
  "delivery_files",
  {
    deliveryId: uuid("delivery_id").notNull(),
    path: text("path").notNull(),
    versionId: uuid("version_id").notNull(),
    frame: integer("frame").notNull(),
    kind: text("kind", { enum: fileKinds }).notNull(),
    sha256: sha256("sha256").notNull(),
    bytes: bigint("bytes", { mode: "number" }).notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.deliveryId, table.path] }),
    foreignKey({
      columns: [table.deliveryId, table.versionId],
      foreignColumns: [deliveryItems.deliveryId, deliveryItems.versionId],
    }),
    foreignKey({
      name: "delivery_files_exact",
      columns: [table.versionId, table.frame, table.kind, table.sha256],
      foreignColumns: [frameFiles.versionId, frameFiles.frame, frameFiles.kind, frameFiles.sha256],
    }),
  ],
);

/** The texts that go with the frames: manifest, setup.json, science note. */
export const deliveryDocuments = pgTable(
  "delivery_documents",
  {
    deliveryId: uuid("delivery_id")
      .notNull()
      .references(() => deliveries.id),
    path: text("path").notNull(),
    body: text("body").notNull(),
    sha256: sha256("sha256").notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.deliveryId, table.path] }),
    check(
      "delivery_documents_sha256",
      sql`${table.sha256} = encode(sha256(convert_to(${table.body}, 'UTF8')), 'hex')`,
    ),
  ],
);

export const recipients = pgTable(
  "recipients",
  {
    deliveryId: uuid("delivery_id")
      .notNull()
      .references(() => deliveries.id),
    personId: uuid("person_id")
      .notNull()
      .references(() => people.id),
    expiresAt: at("expires_at").notNull(),
    revokedAt: at("revoked_at"),
  },
  (table) => [primaryKey({ columns: [table.deliveryId, table.personId] })],
);

export const downloads = pgTable(
  "downloads",
  {
    id: id(),
    deliveryId: uuid("delivery_id").notNull(),
    personId: uuid("person_id").notNull(),
    /** "everything", or the path of one file. */
    what: text("what").notNull(),
    bytes: bigint("bytes", { mode: "number" }).notNull().default(0),
    startedAt: now("started_at"),
    finishedAt: at("finished_at"),
  },
  (table) => [
    foreignKey({
      columns: [table.deliveryId, table.personId],
      foreignColumns: [recipients.deliveryId, recipients.personId],
    }),
  ],
);

/** The client's signed word. Insert-only, one from each recipient. */
export const receipts = pgTable(
  "receipts",
  {
    deliveryId: uuid("delivery_id").notNull(),
    personId: uuid("person_id").notNull(),
    kind: text("kind", { enum: receiptKinds }).notNull(),
    manifestDigest: sha256("manifest_digest").notNull(),
    words: text("words").notNull().default(""),
    statement: text("statement").notNull(),
    signedAt: now("signed_at"),
  },
  (table) => [
    primaryKey({ columns: [table.deliveryId, table.personId] }),
    foreignKey({
      columns: [table.deliveryId, table.personId],
      foreignColumns: [recipients.deliveryId, recipients.personId],
    }),
    check("receipts_kind", sql`${table.kind} in ('received', 'refused')`),
  ],
);
