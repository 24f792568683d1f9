import { randomUUID } from "node:crypto";
import { mkdir, open, readdir, rename, rm, stat } from "node:fs/promises";
import { join } from "node:path";
import type { Readable } from "node:stream";
import { checkName, flush, hashOf, missing, spool } from "./content";
import type { ByteRange, Storage, StoredFile } from "./stored-file";

/** A folder as ab/cd…; a file appears under its name only when it is whole and on the disk. */
export function folderStorage(root: string): Storage {
  const pathOf = (sha256: string) => join(root, checkName(sha256).slice(0, 2), sha256.slice(2));
  const size = async (sha256: string) => {
    const found = await stat(pathOf(sha256)).catch(ignoreMissing);
    return found?.size;
  };
  const openFile = async (sha256: string, range?: ByteRange): Promise<Readable> => {
    const handle = await open(pathOf(sha256), "r").catch(ignoreMissing);
    if (!handle) throw missing(sha256);
    return handle.createReadStream(range);
  };
  return {
    put: (content) => putFile(root, pathOf, content),
    open: openFile,
    size,
    verify: async (sha256) =>
      (await size(sha256)) !== undefined && (await hashOf(await openFile(sha256))) === sha256,
  };
}

async function putFile(
  root: string,
  pathOf: (sha256: string) => string,
  content: Uint8Array | Readable,
): Promise<StoredFile> {
  const incoming = join(root, "incoming");
  await mkdir(incoming, { recursive: true });
  const temporary = join(incoming, randomUUID());
  try {
    const stored = await spool(content, temporary);
    const path = pathOf(stored.sha256);
    const folder = join(path, "..");
    if (await mkdir(folder, { recursive: true })) await flush(root);
    // Renaming over a file of the same name replaces it by the same bytes, and mends one that was damaged.
    await rename(temporary, path);
    await flush(folder);
    return stored;
  } finally {
    await rm(temporary, { force: true });
  }
}

/** Removes what killed processes left half-written more than an hour ago. */
export async function sweepIncoming(root: string, nowMs: number): Promise<void> {
  const incoming = join(root, "incoming");
  for (const name of (await readdir(incoming).catch(ignoreMissing)) ?? []) {
    const found = await stat(join(incoming, name)).catch(ignoreMissing);
    if (found && nowMs - found.mtimeMs > 3_600_000) await rm(join(incoming, name), { force: true });
  }
}

function ignoreMissing(error: NodeJS.ErrnoException): undefined {
  if (error.code !== "ENOENT") throw error;
}
