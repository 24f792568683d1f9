// How a page reads what an e-mailed link opens, before anyone has signed in.
import type { Ctx } from "@/lib/context";
import { database } from "@/lib/database";
import { DomainError } from "@/lib/errors";

/** What the link opens, or in words why it does not. */
export async function openLink<T>(
  verb: (open: Pick<Ctx, "db">, input: { token: string }) => Promise<T>,
  token: string,
): Promise<{ opened: T } | { words: string }> {
  try {
    return { opened: await verb({ db: database() }, { token }) };
  } catch (error) {
    if (error instanceof DomainError) return { words: error.message };
    throw error;
  }
}
