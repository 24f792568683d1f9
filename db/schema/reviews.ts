import { sql } from "drizzle-orm";
import { check, foreignKey, integer, pgTable, primaryKey, text, unique, uuid } from "drizzle-orm/pg-core";
import { roles, verdictKinds } from "../enums";
import { id, now, sha256 } from "./columns";
import { people } from "./people";
import { frames, seals } from "./versions";

/** A version sent for review, once. Only a sealed version can be sent. */
export const submissions = pgTable(
  "submissions",
  {
    versionId: uuid("version_id").primaryKey(),
    digest: sha256("digest").notNull(),
    words: text("words").notNull(),
    sentBy: uuid("sent_by")
      .notNull()
      .references(() => people.id),
    sentAt: now("sent_at"),
  },
  (table) => [
    foreignKey({ columns: [table.versionId, table.digest], foreignColumns: [seals.versionId, seals.digest] }),
  ],
);

/** An advisor's word on frames of a digest. Insert-only; a later one follows, none is altered. */
export const verdicts = pgTable(
  "verdicts",
  {
    id: id(),
    versionId: uuid("version_id")
      .notNull()
      .references(() => submissions.versionId),
    digest: sha256("digest").notNull(),
    kind: text("kind", { enum: verdictKinds }).notNull(),
    first: integer("first").notNull(),
    last: integer("last").notNull(),
    words: text("words").notNull(),
    /** The whole declaration, as it stood on the screen when it was given. */
    statement: text("statement").notNull(),
    givenBy: uuid("given_by")
      .notNull()
      .references(() => people.id),
    givenAs: text("given_as", { enum: roles }).notNull(),
    givenAt: now("given_at"),
  },
  (table) => [
    unique("verdicts_exact").on(table.id, table.versionId, table.digest, table.kind),
    foreignKey({ columns: [table.versionId, table.digest], foreignColumns: [seals.versionId, seals.digest] }),
    check("verdicts_kind", sql`${table.kind} in ('signed off', 'returned', 'withdrawn')`),
    check("verdicts_range", sql`${table.last} >= ${table.first}`),
  ],
);

/** The one verdict that stands on each frame, kept by a trigger on `verdicts`. */
export const standingVerdicts = pgTable(
  "standing_verdicts",
  {
    versionId: uuid("version_id").notNull(),
    frame: integer("frame").notNull(),
    verdictId: uuid("verdict_id")
      .notNull()
      .references(() => verdicts.id),
    kind: text("kind", { enum: verdictKinds }).notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.versionId, table.frame] }),
    foreignKey({
      columns: [table.versionId, table.frame],
      foreignColumns: [frames.versionId, frames.number],
    }),
  ],
);
