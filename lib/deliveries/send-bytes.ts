import { pipeline, Readable } from "node:stream";
import type { Ctx } from "../context";
import { log } from "../log";
import { countBytes, DamagedFile, sliceBytes } from "./byte-streams";
import { finishDownload } from "./finish-download";
import { parseRange } from "./parse-range";
import { reportDamage } from "./report-damage";
import { startDownload } from "./start-download";

export interface Sending {
  delivery: string;
  /** As the log names it: "everything", a version, or a path. */
  what: string;
  fileName: string;
  type: string;
  bytes: number;
  /** Changes when the bytes would. */
  tag: string;
  open: () => Promise<Readable>;
}

/** Answers with bytes, or the part of them that was asked for, and writes down what was taken. Only GET takes. */
export async function sendBytes(ctx: Ctx, sending: Sending, request: Request): Promise<Response> {
  const tag = `"${sending.tag}"`;
  const resumes = [null, tag].includes(request.headers.get("if-range"));
  const range = parseRange(resumes ? request.headers.get("range") : null, sending.bytes);
  if (range === "beyond")
    return new Response(null, { status: 416, headers: { "content-range": `bytes */${sending.bytes}` } });
  const { start, end } = range === "whole" ? { start: 0, end: sending.bytes - 1 } : range;
  const headers = {
    "content-type": sending.type,
    "content-length": String(end - start + 1),
    "content-disposition": `attachment; filename="${sending.fileName}"`,
    "accept-ranges": "bytes",
    "cache-control": "private, no-store",
    etag: tag,
    ...(range !== "whole" && { "content-range": `bytes ${start}-${end}/${sending.bytes}` }),
  };
  const status = range === "whole" ? 200 : 206;
  if (request.method === "HEAD") return new Response(null, { status, headers });

  const download = await startDownload(ctx, sending);
  const source = await openNamed(ctx, sending);
  const counter = countBytes(async (bytes) => {
    // A part from the middle is no whole: the download that reaches the end is the one that finishes.
    if (end === sending.bytes - 1) await finishDownload(ctx, { download, bytes });
  });
  pipeline(source, sliceBytes(start, end), counter, (error) => {
    if (error instanceof DamagedFile) void report(ctx, sending.delivery, error);
  });
  return new Response(Readable.toWeb(counter) as ReadableStream<Uint8Array>, { status, headers });
}

async function openNamed(ctx: Ctx, sending: Sending): Promise<Readable> {
  try {
    return await sending.open();
  } catch (error) {
    if (error instanceof DamagedFile) await report(ctx, sending.delivery, error);
    throw error;
  }
}

// The download has broken off by now: what fails here can only be written to the process's own log.
async function report(ctx: Ctx, delivery: string, damage: DamagedFile): Promise<void> {
  await reportDamage(ctx, { delivery, damage }).catch((error: unknown) =>
    log.error({ requestId: ctx.requestId, err: error }, "fault"),
  );
}
