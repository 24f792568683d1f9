import type { Readable } from "node:stream";
import { ZipFile, type ReadStreamOptions } from "yazl";
import type { PackageEntry } from "./find-contents";
import { openEntry } from "./open-entry";

// Frames do not compress, and an archive's bytes must not depend on when or where it is written: DOS time, at its zero.
const plain: Partial<ReadStreamOptions> = {
  compress: false,
  mtime: new Date(1980, 0, 1),
  forceDosTimestamp: true,
  mode: 0o100644,
};

type Answer = (error: Error | null, source: NodeJS.ReadableStream) => void;

// yazl hands the size to this callback, which its types leave out.
type End = (options: object, whenSized: (bytes: number) => void) => void;

/** How long the archive will be, to the byte, without opening a file. */
export function measureZip(folder: string, entries: readonly PackageEntry[]): number {
  const zip = new ZipFile();
  addEntries(zip, folder, entries, () => undefined);
  let size = 0;
  (zip.end as unknown as End).call(zip, {}, (bytes) => (size = bytes));
  return size;
}

/** The package as one archive, its files opened one after another as they are asked for. Equal entries, equal bytes. */
export function zipEntries(folder: string, entries: readonly PackageEntry[]): Readable {
  const zip = new ZipFile();
  const stream = zip.outputStream as Readable;
  const fail = (error: Error) => stream.destroy(error);
  let open: Readable | undefined;
  zip.on("error", fail);
  stream.on("close", () => open?.destroy());
  addEntries(zip, folder, entries, (entry, answer) => {
    openEntry(entry).then((source) => {
      open = source.on("error", fail);
      if (stream.destroyed) source.destroy();
      else answer(null, source);
    }, fail);
  });
  zip.end();
  return stream;
}

function addEntries(
  zip: ZipFile,
  folder: string,
  entries: readonly PackageEntry[],
  open: (entry: PackageEntry, answer: Answer) => void,
): void {
  for (const entry of entries)
    zip.addReadStreamLazy(`${folder}/${entry.path}`, { ...plain, size: entry.bytes }, (answer) =>
      open(entry, answer),
    );
}
