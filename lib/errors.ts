// The closed union of what can go wrong by rule. Anything else is a fault: logged with an id and shown as that id.
import type { z } from "zod";

export const errorCodes = [
  "invalid",
  "not-signed-in",
  "forbidden",
  "not-found",
  "conflict",
  "gone",
  "too-many",
  "too-large",
  "unavailable",
] as const;
export type ErrorCode = (typeof errorCodes)[number];

export class DomainError extends Error {
  constructor(
    readonly code: ErrorCode,
    message: string,
    /** The dotted path of the field at fault, when there is one. */
    readonly field?: string,
  ) {
    super(message);
    this.name = "DomainError";
  }
}

const statuses: Record<ErrorCode, number> = {
  invalid: 400,
  "not-signed-in": 401,
  forbidden: 403,
  "not-found": 404,
  conflict: 409,
  gone: 410,
  "too-large": 413,
  "too-many": 429,
  unavailable: 503,
};

export const statusOf = (error: DomainError): number => statuses[error.code];

/** Parses input at the boundary; the first fault becomes a DomainError naming its field. */
export function parseInput<T extends z.ZodType>(schema: T, input: unknown): z.infer<T> {
  const result = schema.safeParse(input);
  if (result.success) return result.data;
  const issue = result.error.issues[0]!;
  const field = issue.path.join(".");
  throw new DomainError("invalid", field ? `${field}: ${issue.message}` : issue.message, field || undefined);
}

/** The row, or a "not found" that says what was looked for. Used where another production's thing must not be told apart from none. */
export function found<T>(row: T | undefined, what: string): T {
  if (row === undefined)
    throw new DomainError("not-found", `There is no such ${what}, or it is not yours to see.`);
  return row;
}
