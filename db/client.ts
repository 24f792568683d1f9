import { drizzle, type NodePgDatabase } from "drizzle-orm/node-postgres";
import pg from "pg";
import * as schema from "./schema";

export type Database = NodePgDatabase<typeof schema> & { $client: pg.Pool };
/** Inside a transaction; verbs take either. */
export type Transaction = Parameters<Parameters<Database["transaction"]>[0]>[0];

/** Opens a pool on the given URL. The caller ends it with `database.$client.end()`. */
export function openDatabase(url: string, connections = 10): Database {
  const pool = new pg.Pool({ connectionString: url, max: connections });
  // A connection that dies while idle (a restarted server) is replaced at the next query; without a listener it would end the process.
  pool.on("error", () => undefined);
  // So is one that dies within a transaction, between two of its queries: the next query fails, and the transaction with it.
  pool.on("connect", (client) => client.on("error", () => undefined));
  return drizzle(pool, { schema });
}
