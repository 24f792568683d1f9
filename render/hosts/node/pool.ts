// One pool of worker threads per process, made when first needed.
import { availableParallelism } from "node:os";
import { fileURLToPath } from "node:url";
import { Piscina } from "piscina";

export const threads = availableParallelism();

let pool: Piscina | undefined;

export function threadPool(): Piscina {
  pool ??= new Piscina({
    filename: fileURLToPath(new URL("./thread-entry.mjs", import.meta.url)),
    execArgv: [],
    minThreads: 1,
    maxThreads: threads,
    idleTimeout: 30_000,
  });
  return pool;
}

/** Ends the threads once their work is done. The next frame makes a new pool. */
export async function closePool(): Promise<void> {
  const closing = pool;
  pool = undefined;
  await closing?.close();
}
