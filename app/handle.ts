// The one wrapper of every route handler: request id, origin, actor, parsing, the verb, and errors in words.
import { randomUUID } from "node:crypto";
import type { z } from "zod";
import { currentActor } from "@/lib/auth/session";
import type { Ctx } from "@/lib/context";
import { database } from "@/lib/database";
import { DomainError, parseInput } from "@/lib/errors";
import { checkOrigin, errorResponse, readInput } from "./request";
import { log } from "@/lib/log";

type Segment = { params: Promise<Record<string, string | string[]>> };

/** Turns a verb into a route handler. A verb's Response (a download, a stream) is passed on; anything else becomes JSON. */
export function handle<S extends z.ZodType, T>(
  schema: S,
  verb: (ctx: Ctx, input: z.infer<S>, request: Request) => Promise<T>,
) {
  return (request: Request, segment: Segment) =>
    answer(request, async (requestId) => {
      const actor = await currentActor();
      if (!actor) throw new DomainError("not-signed-in", "Sign in first.");
      const input = parseInput(schema, await readInput(request, await segment.params));
      return verb({ db: database(), actor, requestId }, input, request);
    });
}

/** As `handle`, for what a person may do before they have signed in (accept an invitation, ask for a reset). */
export function handleOpen<S extends z.ZodType, T>(
  schema: S,
  verb: (open: Omit<Ctx, "actor">, input: z.infer<S>, request: Request) => Promise<T>,
) {
  return (request: Request, segment: Segment) =>
    answer(request, async (requestId) => {
      const input = parseInput(schema, await readInput(request, await segment.params));
      return verb({ db: database(), requestId }, input, request);
    });
}

async function answer(request: Request, work: (requestId: string) => Promise<unknown>): Promise<Response> {
  const requestId = request.headers.get("x-request-id") ?? randomUUID();
  const started = performance.now();
  let response: Response;
  try {
    checkOrigin(request);
    const result = await work(requestId);
    response = result instanceof Response ? result : Response.json(result ?? null);
  } catch (error) {
    response = errorResponse(error, requestId);
  }
  response.headers.set("x-request-id", requestId);
  const { pathname } = new URL(request.url);
  const milliseconds = Math.round(performance.now() - started);
  log.info(
    { requestId, method: request.method, path: pathname, status: response.status, milliseconds },
    "request",
  );
  return response;
}
