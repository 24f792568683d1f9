import { mkdtempSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { expect, it } from "vitest";
import { findBrokenPaths, findPaths } from "@/lib/local/document-paths.mjs";

it("a path in a code span is found, also inside a command", () => {
  expect(findPaths("See `lib/local/ports.mjs` or type `node lib/local/start.mjs up`.")).toEqual([
    "lib/local/ports.mjs",
    "lib/local/start.mjs",
  ]);
});

it("addresses, packages, patterns, prose and generated folders are not paths", () => {
  const text =
    "`/api/ready` `http://127.0.0.1:3000` `@scope/name` `lib/<noun>/x.ts` app/nowhere `.data/mail`";
  expect(findPaths(text)).toEqual([]);
});

it("links to files count, links elsewhere do not", () => {
  const text = "![shots](public/shots.png) [site](https://ringwright.example/a/b) [below](#limits)";
  expect(findPaths(text)).toEqual(["public/shots.png"]);
});

it("a path that does not exist is named with its document", () => {
  const root = mkdtempSync(join(tmpdir(), "ringwright-documents-"));
  writeFileSync(join(root, "README.md"), "`app/gone.ts`");
  expect(findBrokenPaths(root, ["README.md", "DEVELOPERS.md"])).toEqual([
    "README.md names app/gone.ts, which does not exist.",
    "DEVELOPERS.md is missing.",
  ]);
});
