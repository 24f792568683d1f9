// The one way in which a page asks the server for something to be read or done.

/** A refusal in words, with the field at fault when there is one. */
export class RequestError extends Error {
  constructor(
    message: string,
    /** A code of lib/errors, "fault" for a failure on our side, "unreachable" when no answer came. */
    readonly code: string,
    readonly field?: string,
  ) {
    super(message);
    this.name = "RequestError";
  }
}

export interface RequestOptions {
  method?: "GET" | "POST" | "PUT" | "PATCH" | "DELETE";
  body?: unknown;
  signal?: AbortSignal;
}

/** Sends JSON and reads JSON; throws a RequestError whose message can be shown as it is. */
export async function requestJson<T = unknown>(path: string, options: RequestOptions = {}): Promise<T> {
  const { body, signal } = options;
  const response = await send(path, {
    method: options.method ?? (body === undefined ? "GET" : "POST"),
    headers: {
      accept: "application/json",
      ...(body !== undefined && { "content-type": "application/json" }),
    },
    body: body === undefined ? undefined : JSON.stringify(body),
    signal,
  });
  const answer: unknown = await response.json().catch(() => undefined);
  if (response.ok) return answer as T;
  throw refusalOf(answer, response.status);
}

async function send(path: string, init: RequestInit): Promise<Response> {
  try {
    return await fetch(path, init);
  } catch (error) {
    if (init.signal?.aborted) throw error;
    throw new RequestError(
      "The server could not be reached. Check the connection and try again.",
      "unreachable",
    );
  }
}

function refusalOf(answer: unknown, status: number): RequestError {
  const error = (answer as { error?: { code?: string; message?: string; field?: string } } | undefined)
    ?.error;
  if (error?.message) return new RequestError(error.message, error.code ?? "fault", error.field);
  return new RequestError(`The server answered ${status} without saying why. Try again.`, "fault");
}
