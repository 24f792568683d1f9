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
