// What both kinds of storage need: hashing what flows past, and words for what is missing.
import { createHash } from "node:crypto";
import { createWriteStream } from "node:fs";
import { open } from "node:fs/promises";
import { Readable, Transform } from "node:stream";
import { pipeline } from "node:stream/promises";
import { DomainError } from "../errors";
import type { StoredFile } from "./stored-file";

/** Refuses anything that is not a name of ours, so that no name can lead out of the folder. */
export function checkName(sha256: string): string {
  if (/^[0-9a-f]{64}$/.test(sha256)) return sha256;
  throw new DomainError("invalid", "A stored file is named by 64 hexadecimal figures.", "sha256");
}

export function missing(sha256: string): DomainError {
  return new DomainError(
    "unavailable",
    `The file ${sha256.slice(0, 8)}… is not in storage. Restore the storage from its backup.`,
  );
}

/** Writes the content to a new file, through to the disk, and returns its name and length. */
export async function spool(content: Uint8Array | Readable, path: string): Promise<StoredFile> {
  const hash = createHash("sha256");
  let bytes = 0;
  const measure = new Transform({
    transform(chunk: Buffer, _encoding, done) {
      hash.update(chunk);
      bytes += chunk.length;
      done(null, chunk);
    },
  });
  const source = content instanceof Readable ? content : Readable.from([Buffer.from(content)]);
  await pipeline(source, measure, createWriteStream(path, { flags: "wx" }));
  await flush(path);
  return { sha256: hash.digest("hex"), bytes };
}

/** Waits until a file, or a folder's entries, would survive a power cut. */
export async function flush(path: string): Promise<void> {
  const handle = await open(path, "r");
  try {
    await handle.sync();
  } finally {
    await handle.close();
  }
}

export async function hashOf(content: Readable): Promise<string> {
  const hash = createHash("sha256");
  for await (const chunk of content) hash.update(chunk as Buffer);
  return hash.digest("hex");
}
