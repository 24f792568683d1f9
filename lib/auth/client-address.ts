/** The address a request came from, as the server or the proxy before it noted; only ever used to count tries. */
export function clientAddress(headers: Headers | Record<string, unknown> | undefined): string {
  const noted = headers instanceof Headers ? headers.get("x-forwarded-for") : headers?.["x-forwarded-for"];
  // A proxy appends what it saw itself, so the last entry is the one a client could not write.
  return String(noted ?? "unknown")
    .split(",")
    .at(-1)!
    .trim();
}
