import { sql } from "drizzle-orm";
import { check, integer, pgTable, text, unique, uuid } from "drizzle-orm/pg-core";
import { productionKinds } from "../enums";
import { id, now } from "./columns";

export const productions = pgTable(
  "productions",
  {
    id: id(),
    /** The short code that begins its file names, as LH in LH-020. */
    code: text("code").notNull().unique(),
    name: text("name").notNull(),
    kind: text("kind", { enum: productionKinds }).notNull(),
    createdAt: now("created_at"),
  },
  (table) => [
    check("productions_kind", sql`${table.kind} in ('film', 'dome')`),
    check("productions_code", sql`${table.code} ~ '^[A-Z][A-Z0-9]{1,7}$'`),
  ],
);

export const sequences = pgTable(
  "sequences",
  {
    id: id(),
    productionId: uuid("production_id")
      .notNull()
      .references(() => productions.id),
    number: integer("number").notNull(),
    name: text("name").notNull(),
    createdAt: now("created_at"),
  },
  (table) => [
    unique("sequences_number").on(table.productionId, table.number),
    unique("sequences_in_production").on(table.id, table.productionId),
  ],
);
