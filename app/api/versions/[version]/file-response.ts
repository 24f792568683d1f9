// A stored file as an answer: it never changes, so a browser may keep it; but only the one that was let in.
import { Readable } from "node:stream";
import type { ByteRange } from "@/lib/storage/stored-file";
import type { OpenFile } from "@/lib/versions/open-frame-file";

const contentTypes = { png: "image/png", exr: "image/x-exr" } as const;

export const immutable = (etag: string) => ({
  etag: `"${etag}"`,
  "cache-control": "private, max-age=31536000, immutable",
});

export const isFresh = (request: Request, etag: string): boolean =>
  request.headers.get("if-none-match")?.includes(`"${etag}"`) ?? false;

export const notModified = (etag: string): Response =>
  new Response(null, { status: 304, headers: immutable(etag) });

/** Streams the file, or the part of it that was asked for, so that a broken download can be taken up again. */
export async function fileResponse(request: Request, file: OpenFile): Promise<Response> {
  if (isFresh(request, file.sha256)) return notModified(file.sha256);
  const headers = {
    ...immutable(file.sha256),
    "content-type": contentTypes[file.kind],
    "content-disposition": `${file.kind === "png" ? "inline" : "attachment"}; filename="${file.name}"`,
    "accept-ranges": "bytes",
  };
  const range = readRange(request.headers.get("range"), file.bytes);
  if (range === "outside")
    return new Response(null, { status: 416, headers: { "content-range": `bytes */${file.bytes}` } });
  const body = Readable.toWeb(await file.open(range)) as ReadableStream;
  if (!range) return new Response(body, { headers: { ...headers, "content-length": String(file.bytes) } });
  const { start, end } = range;
  return new Response(body, {
    status: 206,
    headers: {
      ...headers,
      "content-length": String(end - start + 1),
      "content-range": `bytes ${start}-${end}/${file.bytes}`,
    },
  });
}

/** One range of bytes (RFC 9110 §14); several at once, or anything unreadable, is answered with the whole file. */
export function readRange(header: string | null, size: number): ByteRange | "outside" | undefined {
  const [, from, to] = /^bytes=(\d*)-(\d*)$/.exec(header ?? "") ?? [];
  if (from === undefined || to === undefined || (from === "" && to === "")) return undefined;
  const start = from === "" ? Math.max(0, size - Number(to)) : Number(from);
  const end = from === "" || to === "" ? size - 1 : Math.min(size - 1, Number(to));
  return start > end || start >= size ? "outside" : { start, end };
}
