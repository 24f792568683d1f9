// Reading a request and wording its refusal.
import { DomainError, statusOf } from "@/lib/errors";
import { log } from "@/lib/log";

const bodyLimit = 1_000_000;

/** Refuses a change asked for by another site's page: the browser says where a request comes from. */
export function checkOrigin(request: Request): void {
  if (request.method === "GET" || request.method === "HEAD") return;
  const origin = request.headers.get("origin");
  const host = request.headers.get("host");
  // A sandboxed page sends the word "null", which is no URL and no origin of ours.
  if (origin !== null && (!URL.canParse(origin) || new URL(origin).host !== host))
    throw new DomainError(
      "forbidden",
      "This change was asked for by another site's page, so it was not made.",
    );
}

/** The request's input: JSON body, query and path segments in one object; the path wins. */
export async function readInput(
  request: Request,
  params: Record<string, string | string[]>,
): Promise<unknown> {
  const query = Object.fromEntries(new URL(request.url).searchParams);
  if (request.method === "GET" || request.method === "HEAD") return { ...query, ...params };
  const text = await readText(request);
  if (text === "") return { ...query, ...params };
  return { ...query, ...asObject(text), ...params };
}

/** Reads the body, and stops reading once it is too large, whatever length it claimed. */
async function readText(request: Request): Promise<string> {
  const pieces: Uint8Array[] = [];
  let bytes = 0;
  for await (const piece of request.body ?? []) {
    bytes += piece.byteLength;
    if (bytes > bodyLimit) throw new DomainError("too-large", "The request's body is larger than 1 MB.");
    pieces.push(piece);
  }
  return Buffer.concat(pieces).toString("utf8");
}

function asObject(text: string): object {
  let body: unknown;
  try {
    body = JSON.parse(text);
  } catch {
    throw new DomainError("invalid", "body: This is not JSON. Send one JSON object.", "body");
  }
  if (typeof body === "object" && body !== null && !Array.isArray(body)) return body;
  throw new DomainError("invalid", "body: Send one JSON object.", "body");
}

/** The one place where errors become HTTP. A fault's text stays in the log; the person is given its id. */
export function errorResponse(error: unknown, requestId: string): Response {
  if (error instanceof DomainError)
    return Response.json(
      { error: { code: error.code, message: error.message, field: error.field } },
      { status: statusOf(error) },
    );
  log.error({ requestId, err: error }, "fault");
  const message = `Something failed on our side. It is in the log as ${requestId}.`;
  return Response.json({ error: { code: "fault", message } }, { status: 500 });
}
