import { sql } from "drizzle-orm";
import {
  bigint,
  boolean,
  check,
  integer,
  pgTable,
  primaryKey,
  text,
  uniqueIndex,
  uuid,
  varchar,
} from "drizzle-orm/pg-core";
import { linkPurposes, roles } from "../enums";
import { at, id, now, sha256 } from "./columns";
import { productions } from "./productions";

export const people = pgTable(
  "people",
  {
    id: id(),
    email: text("email").notNull(),
    name: text("name").notNull(),
    passwordHash: text("password_hash").notNull(),
    timeZone: text("time_zone").notNull().default("UTC"),
    isOwner: boolean("is_owner").notNull().default(false),
    /** Raised when a password changes or a person leaves, so that older sessions end at once. */
    sessionEpoch: integer("session_epoch").notNull().default(1),
    createdAt: now("created_at"),
    leftAt: at("left_at"),
  },
  (table) => [
    uniqueIndex("people_email").on(table.email),
    check("people_email_lower", sql`${table.email} = lower(${table.email})`),
  ],
);

export const memberships = pgTable(
  "memberships",
  {
    productionId: uuid("production_id")
      .notNull()
      .references(() => productions.id),
    personId: uuid("person_id")
      .notNull()
      .references(() => people.id),
    role: text("role", { enum: roles }).notNull(),
    createdAt: now("created_at"),
    endedAt: at("ended_at"),
  },
  (table) => [
    primaryKey({ columns: [table.productionId, table.personId] }),
    check("memberships_role", sql`${table.role} in ('artist', 'advisor', 'producer', 'client')`),
  ],
);

/** Single-use links sent by e-mail; only the SHA-256 of the token is kept. */
export const links = pgTable(
  "links",
  {
    id: id(),
    purpose: text("purpose", { enum: linkPurposes }).notNull(),
    tokenHash: sha256("token_hash").notNull().unique(),
    email: text("email").notNull(),
    /** The name an inviter gave; empty for a password reset. */
    name: text("name").notNull().default(""),
    personId: uuid("person_id").references(() => people.id),
    productionId: uuid("production_id").references(() => productions.id),
    role: text("role", { enum: roles }),
    createdBy: uuid("created_by").references(() => people.id),
    createdAt: now("created_at"),
    expiresAt: at("expires_at").notNull(),
    usedAt: at("used_at"),
    revokedAt: at("revoked_at"),
  },
  (table) => [check("links_purpose", sql`${table.purpose} in ('invitation', 'password reset')`)],
);

/** The table rate-limiter-flexible keeps its counts in. */
export const rateLimits = pgTable("rate_limits", {
  key: varchar("key", { length: 255 }).primaryKey(),
  points: integer("points").notNull().default(0),
  expire: bigint("expire", { mode: "number" }),
});
