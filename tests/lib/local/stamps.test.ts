import { mkdirSync, mkdtempSync, rmSync, utimesSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { beforeEach, expect, it } from "vitest";
import { stampOf } from "@/lib/local/stamps.mjs";

let root = "";
beforeEach(() => {
  root = mkdtempSync(join(tmpdir(), "ringwright-stamps-"));
  mkdirSync(join(root, "app", "deep"), { recursive: true });
  writeFileSync(join(root, "app", "page.tsx"), "one");
  writeFileSync(join(root, "app", "deep", "part.tsx"), "two");
  writeFileSync(join(root, "next.config.mjs"), "three");
});

const stamp = () => stampOf(root, ["app", "next.config.mjs", "proxy.ts"]);

it("a file that was only touched asks for no new build", () => {
  const before = stamp();
  utimesSync(join(root, "app", "page.tsx"), new Date(0), new Date(0));
  expect(stamp()).toBe(before);
});

it("a changed, added, renamed or removed file asks for one", () => {
  const seen = [stamp()];
  writeFileSync(join(root, "app", "deep", "part.tsx"), "two and more");
  seen.push(stamp());
  writeFileSync(join(root, "proxy.ts"), "");
  seen.push(stamp());
  writeFileSync(join(root, "app", "other.tsx"), "one");
  rmSync(join(root, "app", "page.tsx"));
  seen.push(stamp());
  rmSync(join(root, "app", "other.tsx"));
  seen.push(stamp());
  expect(new Set(seen).size).toBe(seen.length);
});

it("text moved from one file's end to the next file's start is a change", () => {
  writeFileSync(join(root, "app", "a"), "xy");
  writeFileSync(join(root, "app", "b"), "z");
  const before = stamp();
  writeFileSync(join(root, "app", "a"), "x");
  writeFileSync(join(root, "app", "b"), "yz");
  expect(stamp()).not.toBe(before);
});

it("files that are not part of the build do not count", () => {
  const keep = (path: string) => !path.startsWith("app/deep/");
  const before = stampOf(root, ["app"], keep);
  writeFileSync(join(root, "app", "deep", "part.tsx"), "other");
  expect(stampOf(root, ["app"], keep)).toBe(before);
});
