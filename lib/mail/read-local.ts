import { readdir, readFile } from "node:fs/promises";
import { join } from "node:path";
import { authorize } from "../auth/authorize";
import type { Ctx } from "../context";
import { environment } from "../environment";
import { DomainError } from "../errors";
import { localLetterSchema, type LocalLetter } from "./local-letter";

const shown = 200;

/** The newest letters of the local mail server, in local use only, for the studio's owner. */
export async function readLocalMail({ actor }: Ctx): Promise<{ letters: LocalLetter[]; total: number }> {
  authorize(actor, "studio.mail", null);
  const { RINGWRIGHT_LOCAL, MAIL_DIR } = environment();
  if (RINGWRIGHT_LOCAL !== "1")
    throw new DomainError("not-found", "Mail is shown only where it goes to the local mail server.");
  const names = (await readdir(MAIL_DIR).catch(ignoreMissing)).filter((name) => name.endsWith(".json"));
  const newest = names.sort().reverse().slice(0, shown);
  const letters = await Promise.all(newest.map((name) => readLetter(join(MAIL_DIR, name))));
  return { letters, total: names.length };
}

async function readLetter(path: string): Promise<LocalLetter> {
  return localLetterSchema.parse(JSON.parse(await readFile(path, "utf8")));
}

// No folder yet: no letter was ever sent.
function ignoreMissing(error: NodeJS.ErrnoException): string[] {
  if (error.code === "ENOENT") return [];
  throw error;
}
