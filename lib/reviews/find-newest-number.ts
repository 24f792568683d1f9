import { desc, eq } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import { versions } from "@/db/schema/versions";

/** The number of the shot's newest version, the one that governs; 0 when it has none. */
export async function findNewestNumber(db: Database | Transaction, shotId: string): Promise<number> {
  const [newest] = await db
    .select({ number: versions.number })
    .from(versions)
    .where(eq(versions.shotId, shotId))
    .orderBy(desc(versions.number))
    .limit(1);
  return newest?.number ?? 0;
}
