// The published check values (tests/fixtures/published.json), one loader for every section's test file.
import { readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { expect } from "vitest";

/** A value the file gives: a number, a word, or a structure of them. */
export type Given = number | string | boolean | null | Given[] | { [name: string]: Given };

interface Tolerance {
  rel?: number;
  abs?: number;
  why?: string;
}

export interface Entry {
  id: string;
  section: number;
  quantity: string;
  inputs: Record<string, Given>;
  expected: Given;
  tolerance: Tolerance;
  source: { authors?: string; year?: number | string; title?: string; where?: string };
}

const file = fileURLToPath(new URL("../../fixtures/published.json", import.meta.url));
const entries = (JSON.parse(readFileSync(file, "utf8")) as { entries: Entry[] }).entries;

/** Every entry of one section, in the file's order. */
export function entriesOf(section: number): Entry[] {
  return entries.filter((entry) => entry.section === section);
}

/** A test's name: the entry's id, what it states, and whose result it is. */
export function nameOf({ id, quantity, source }: Entry): string {
  return `${id}: agrees with ${source.authors ?? "its source"} ${source.year ?? ""} on ${quantity}`;
}

/** An input that must be a number. */
export function numberIn(entry: Entry, name: string): number {
  const value = entry.inputs[name];
  if (typeof value !== "number") throw new Error(`${entry.id}: input ${name} is not a number`);
  return value;
}

/** The largest difference an entry allows from `expected`: the wider of its two bounds, times max(1, condition). */
export function allowance({ tolerance }: Entry, expected: number, condition = 1): number {
  const widest = Math.max(tolerance.abs ?? 0, (tolerance.rel ?? 0) * Math.abs(expected));
  return widest * Math.max(1, condition);
}

/** Fails unless `actual` is within the entry's allowance of `expected`. */
export function expectWithin(
  entry: Entry,
  what: string,
  actual: number,
  expected: number,
  condition = 1,
): void {
  const allowed = allowance(entry, expected, condition);
  const message = `${entry.id} ${what}: ${actual} against ${expected}, allowed ${allowed}`;
  expect(Math.abs(actual - expected) <= allowed, message).toBe(true);
}

/**
 * Fails unless `actual` has every number and word of the entry's expected value, each number within its allowance.
 * A crossing's own `condition` applies to the numbers beside it.
 */
export function expectAgreement(
  entry: Entry,
  actual: unknown,
  expected: Given = entry.expected,
  what = "value",
  condition = 1,
): void {
  if (typeof expected === "number") expectWithin(entry, what, actual as number, expected, condition);
  else if (typeof expected !== "object" || expected === null)
    expect(actual, `${entry.id} ${what}`).toBe(expected);
  else {
    const own = "condition" in expected ? (expected as { condition: number }).condition : condition;
    if (Array.isArray(expected)) expect(actual, `${entry.id} ${what}`).toHaveLength(expected.length);
    for (const [name, value] of Object.entries(expected))
      if (name !== "condition")
        expectAgreement(entry, (actual as Record<string, unknown>)[name], value, `${what}.${name}`, own);
  }
}

/** Runs one check per entry of a section, chosen by the middle word of its id; an unknown kind fails its test. */
export function checksOf(section: number, kinds: Record<string, (entry: Entry) => unknown>) {
  return entriesOf(section).map((entry) => {
    const kind = entry.id.split("-")[1] ?? "";
    return {
      name: nameOf(entry),
      run: () => {
        const evaluate = kinds[kind];
        if (!evaluate) throw new Error(`${entry.id}: no check is written for this kind of entry`);
        expectAgreement(entry, evaluate(entry));
      },
    };
  });
}
