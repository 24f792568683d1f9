// The list of files at the end of an archive (APPNOTE 6.3.10 §4.3.12–16), read without unpacking it. Stored files only:
// a package of ours compresses nothing.
export interface ArchiveEntry {
  path: string;
  /** The entry's own bytes within the archive. */
  content: Blob;
}

const endSignature = 0x06054b50;
const end64Locator = 0x07064b50;
const entrySignature = 0x02014b50;
const tail = 65_557 + 20;

/** Every file in the archive; throws in words when it is not whole. */
export async function readZip(archive: Blob): Promise<ArchiveEntry[]> {
  const { start, count } = await findDirectory(archive);
  const view = new DataView(await archive.slice(start).arrayBuffer());
  const entries: ArchiveEntry[] = [];
  let at = 0;
  for (let index = 0; index < count; index += 1) {
    if (view.byteLength < at + 46 || view.getUint32(at, true) !== entrySignature) throw broken();
    const [name, extra, comment] = [28, 30, 32].map((offset) => view.getUint16(at + offset, true)) as [
      number,
      number,
      number,
    ];
    const path = new TextDecoder().decode(new Uint8Array(view.buffer, at + 46, name));
    const { size, offset } = placeOf(view, at, name, extra);
    const isStored = view.getUint16(at + 10, true) === 0;
    if (!isStored)
      throw new Error(
        `${path} is compressed, so this is not the package as it was delivered. Unpack it and choose its folder.`,
      );
    entries.push({ path, content: await contentOf(archive, offset, size) });
    at += 46 + name + extra + comment;
  }
  return entries.filter(({ path }) => !path.endsWith("/"));
}

const broken = () =>
  new Error("This is no whole archive. The download may have broken off; resume it or take it again.");

async function findDirectory(archive: Blob): Promise<{ start: number; count: number }> {
  const from = Math.max(0, archive.size - tail);
  const view = new DataView(await archive.slice(from).arrayBuffer());
  let at = view.byteLength - 22;
  while (at >= 0 && view.getUint32(at, true) !== endSignature) at -= 1;
  if (at < 0) throw broken();
  const locator = at - 20;
  if (locator >= 0 && view.getUint32(locator, true) === end64Locator) {
    const place = Number(view.getBigUint64(locator + 8, true));
    const long = new DataView(await archive.slice(place, place + 56).arrayBuffer());
    if (long.byteLength < 56) throw broken();
    return { count: Number(long.getBigUint64(32, true)), start: Number(long.getBigUint64(48, true)) };
  }
  return { count: view.getUint16(at + 10, true), start: view.getUint32(at + 16, true) };
}

const unknown = 0xffffffff;

/** Size and place of an entry; what does not fit 32 bits stands in its extra field 1. */
function placeOf(view: DataView, at: number, name: number, extra: number): { size: number; offset: number } {
  let size = view.getUint32(at + 24, true);
  let offset = view.getUint32(at + 42, true);
  const stop = at + 46 + name + extra;
  for (let field = at + 46 + name; field + 4 <= stop; field += 4 + view.getUint16(field + 2, true)) {
    if (view.getUint16(field, true) !== 1) continue;
    let next = field + 4;
    if (size === unknown) {
      size = Number(view.getBigUint64(next, true));
      next += 8;
      // The packed size stands between, and is the same for a stored file.
      if (view.getUint32(at + 20, true) === unknown) next += 8;
    }
    if (offset === unknown) offset = Number(view.getBigUint64(next, true));
  }
  return { size, offset };
}

/** The bytes follow the entry's own header, whose names may be longer than the directory says. */
async function contentOf(archive: Blob, offset: number, size: number): Promise<Blob> {
  const head = new DataView(await archive.slice(offset, offset + 30).arrayBuffer());
  if (head.byteLength < 30) throw broken();
  const start = offset + 30 + head.getUint16(26, true) + head.getUint16(28, true);
  return archive.slice(start, start + size);
}
