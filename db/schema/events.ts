import { sql } from "drizzle-orm";
import {
  bigint,
  bigserial,
  check,
  index,
  integer,
  jsonb,
  pgTable,
  text,
  unique,
  uuid,
} from "drizzle-orm/pg-core";
import { outboxKinds } from "../enums";
import { at, id, now, sha256 } from "./columns";
import { people } from "./people";
import { productions } from "./productions";

/**
 * The log. Append-only, and each row carries the hash of the one before in its production (or in the studio's own
 * chain when it belongs to none). `seq`, `at`, `previous` and `hash` are filled by a trigger.
 */
export const events = pgTable(
  "events",
  {
    id: bigserial("id", { mode: "number" }).primaryKey(),
    productionId: uuid("production_id").references(() => productions.id),
    chain: text("chain").notNull().default(""),
    seq: bigint("seq", { mode: "number" }).notNull().default(0),
    at: now("at"),
    actorId: uuid("actor_id").references(() => people.id),
    kind: text("kind").notNull(),
    /** Ids of what it happened to, and the words the sentence needs, as they were then. */
    subject: jsonb("subject").$type<Record<string, string | number>>().notNull(),
    previous: sha256("previous").notNull().default(""),
    hash: sha256("hash").notNull().default(""),
  },
  (table) => [
    unique("events_chain").on(table.chain, table.seq),
    index("events_production_at").on(table.productionId, table.at),
  ],
);

/** What must leave the house because of a committed change: mail to send, jobs to enqueue. One row per cause, by key. */
export const outbox = pgTable(
  "outbox",
  {
    id: id(),
    key: text("key").notNull().unique(),
    kind: text("kind", { enum: outboxKinds }).notNull(),
    payload: jsonb("payload").notNull(),
    createdAt: now("created_at"),
    /** Not before this time: moved on after each failed attempt. */
    dueAt: now("due_at"),
    attempts: integer("attempts").notNull().default(0),
    lastError: text("last_error"),
    doneAt: at("done_at"),
  },
  (table) => [
    index("outbox_waiting")
      .on(table.dueAt)
      .where(sql`${table.doneAt} is null`),
    check("outbox_kind", sql`${table.kind} in ('mail', 'job')`),
  ],
);
