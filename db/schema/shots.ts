import { sql } from "drizzle-orm";
import { check, date, foreignKey, integer, jsonb, pgTable, text, unique, uuid } from "drizzle-orm/pg-core";
import { holds } from "../enums";
import { id, now } from "./columns";
import { people } from "./people";
import { productions, sequences } from "./productions";

export const shots = pgTable(
  "shots",
  {
    id: id(),
    productionId: uuid("production_id")
      .notNull()
      .references(() => productions.id),
    sequenceId: uuid("sequence_id").notNull(),
    code: text("code").notNull(),
    brief: text("brief").notNull(),
    dueOn: date("due_on", { mode: "string" }),
    /** The artist who has it. */
    artistId: uuid("artist_id").references(() => people.id),
    hold: text("hold", { enum: holds }).notNull().default("none"),
    createdAt: now("created_at"),
  },
  (table) => [
    unique("shots_code").on(table.productionId, table.code),
    unique("shots_in_production").on(table.id, table.productionId),
    foreignKey({
      columns: [table.sequenceId, table.productionId],
      foreignColumns: [sequences.id, sequences.productionId],
    }),
    check("shots_hold", sql`${table.hold} in ('none', 'on hold', 'omitted')`),
    check("shots_code_form", sql`${table.code} ~ '^[A-Z0-9]+(-[A-Z0-9]+)+$'`),
  ],
);

/** The shot's working description. `revision` rises with every save, so that two people cannot overwrite each other. */
export const setups = pgTable("setups", {
  shotId: uuid("shot_id")
    .primaryKey()
    .references(() => shots.id),
  body: jsonb("body").notNull(),
  revision: integer("revision").notNull().default(1),
  savedBy: uuid("saved_by").references(() => people.id),
  savedAt: now("saved_at"),
});
