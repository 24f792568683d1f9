import { mkdtempSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { expect, it } from "vitest";
import {
  addTotals,
  countPlaywright,
  countVitest,
  exitCodeOf,
  formatTotals,
  readTotals,
} from "@/lib/local/totals.mjs";

const folder = mkdtempSync(join(tmpdir(), "ringwright-totals-"));
const count = (report: { passed: number; failed: number }) => report;

it("the last line sums every part", () => {
  const totals = addTotals([
    { passed: 7, failed: 0 },
    { passed: 400, failed: 2 },
    { passed: 0, failed: 1 },
  ]);
  expect(formatTotals(totals)).toBe("407 passed, 3 failed");
});

it("a run in which nothing ran is not a success", () => {
  expect(exitCodeOf(addTotals([]))).toBe(1);
  expect(exitCodeOf({ passed: 5, failed: 1 })).toBe(1);
  expect(exitCodeOf({ passed: 5, failed: 0 })).toBe(0);
});

it("a unit test that was left out counts as failed", () => {
  const file = { status: "passed", assertionResults: [{ status: "passed" }, { status: "pending" }] };
  expect(countVitest({ numPassedTests: 1, numTotalTests: 2, testResults: [file] })).toEqual({
    passed: 1,
    failed: 1,
  });
});

it("a test file that broke before its first test counts as one failure", () => {
  const broken = { status: "failed", assertionResults: [] };
  const whole = { status: "passed", assertionResults: [{ status: "passed" }] };
  const failing = { status: "failed", assertionResults: [{ status: "failed" }] };
  const report = { numPassedTests: 1, numTotalTests: 2, testResults: [broken, whole, failing] };
  expect(countVitest(report)).toEqual({ passed: 1, failed: 2 });
});

it("a browser test passes only by passing: flaky, skipped and outside errors count as failed", () => {
  const stats = { expected: 4, unexpected: 1, flaky: 1, skipped: 2 };
  expect(countPlaywright({ stats, errors: ["the server went away"] })).toEqual({ passed: 4, failed: 5 });
});

it("a runner that left no report counts as one failure", () => {
  expect(readTotals(join(folder, "absent.json"), 0, count)).toEqual({ passed: 0, failed: 1 });
});

it("a runner that ended badly although every test passed counts as one failure", () => {
  const file = join(folder, "report.json");
  writeFileSync(file, JSON.stringify({ passed: 3, failed: 0 }));
  expect(readTotals(file, 1, count)).toEqual({ passed: 3, failed: 1 });
  expect(readTotals(file, 0, count)).toEqual({ passed: 3, failed: 0 });
});
