// From a text of unknown origin to a setup, or to sentences that say where it goes wrong.
import type { z } from "zod";
import { setupSchema, type Setup } from "./setup";

export type Parsed<Value> = { ok: true; value: Value } | { ok: false; problems: string[] };

/** Each problem as "place: message"; the place is written as in code, such as camera.lens.fieldDeg or rays[3].a. */
export function describeIssues(error: z.ZodError, root = ""): string[] {
  return error.issues.map(({ path, message }) => {
    const place = path.reduce<string>(
      (text, key) =>
        typeof key === "number" ? `${text}[${key}]` : text ? `${text}.${String(key)}` : String(key),
      root,
    );
    return place ? `${place}: ${message}` : message;
  });
}

/** Parses text as JSON; a problem says what the text lacks. */
export function jsonFromText(text: string): Parsed<unknown> {
  try {
    return { ok: true, value: JSON.parse(text) };
  } catch (error) {
    return {
      ok: false,
      problems: [`This is not JSON: ${error instanceof Error ? error.message : "unreadable"}.`],
    };
  }
}

export function setupFromJson(text: string): Parsed<Setup> {
  const json = jsonFromText(text);
  if (!json.ok) return json;
  const parsed = setupSchema.safeParse(json.value);
  return parsed.success
    ? { ok: true, value: parsed.data }
    : { ok: false, problems: describeIssues(parsed.error) };
}
