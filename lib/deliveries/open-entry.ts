import { Readable } from "node:stream";
import { storage } from "../storage/storage";
import { checkBytes, DamagedFile } from "./byte-streams";
import type { PackageEntry } from "./find-contents";

/** An entry's bytes. A frame's file is hashed again as it is read, and what is not as it was signed breaks the stream. */
export async function openEntry(entry: PackageEntry): Promise<Readable> {
  if (entry.body !== undefined) return Readable.from([Buffer.from(entry.body, "utf8")]);
  const kept = storage();
  if ((await kept.size(entry.sha256)) === undefined) throw new DamagedFile(entry.path);
  const source = await kept.open(entry.sha256);
  const checked = checkBytes(entry.path, entry.sha256);
  source.on("error", (error) => checked.destroy(error));
  checked.on("close", () => source.destroy());
  return source.pipe(checked);
}
