// Column shapes that every table shares.
import { sql } from "drizzle-orm";
import { char, timestamp, uuid } from "drizzle-orm/pg-core";

export const id = () => uuid("id").primaryKey().defaultRandom();
export const at = (name: string) => timestamp(name, { withTimezone: true, mode: "date" });
export const now = (name: string) =>
  at(name)
    .notNull()
    .default(sql`now()`);
/** A SHA-256 in 64 lower-case hexadecimal figures. */
export const sha256 = (name: string) => char(name, { length: 64 });
