// Canonical JSON (RFC 8785): one text per value, so that equal setups have equal digests. Hashing is the caller's.

/**
 * Keys sorted by UTF-16 code units, no white space, numbers in ECMAScript's shortest form, which gives every double back
 * exactly. Undefined members are left out as in JSON. Throws on what JSON cannot say: NaN, infinities, functions.
 */
export function canonicalJson(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map((item) => canonicalJson(item ?? null)).join(",")}]`;
  if (typeof value === "number" && !Number.isFinite(value)) throw new TypeError(`JSON cannot hold ${value}.`);
  if (value === null || typeof value !== "object") {
    const text: string | undefined = JSON.stringify(value);
    if (text === undefined) throw new TypeError(`JSON cannot hold a ${typeof value}.`);
    return text;
  }
  const members = Object.entries(value)
    .filter(([, member]) => member !== undefined)
    .sort(([a], [b]) => (a < b ? -1 : 1))
    .map(([key, member]) => `${JSON.stringify(key)}:${canonicalJson(member)}`);
  return `{${members.join(",")}}`;
}
