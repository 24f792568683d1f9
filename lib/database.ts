import { openDatabase, type Database } from "@/db/client";
import { environment } from "./environment";

// Next may evaluate a module once per bundle: the pool is kept on the global object so that a process has one.
const holder = globalThis as typeof globalThis & { ringwrightDatabase?: Database };

/** The process's one pool. */
export function database(): Database {
  return (holder.ringwrightDatabase ??= openDatabase(environment().DATABASE_URL));
}
