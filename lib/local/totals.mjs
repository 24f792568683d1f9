import { readFileSync } from "node:fs";

/** @typedef {{ passed: number, failed: number }} Totals */

/** @param {Totals[]} parts @returns {Totals} */
export const addTotals = (parts) =>
  parts.reduce((sum, part) => ({ passed: sum.passed + part.passed, failed: sum.failed + part.failed }), {
    passed: 0,
    failed: 0,
  });

/** @param {Totals} totals */
export const formatTotals = ({ passed, failed }) => `${passed} passed, ${failed} failed`;

/** Nothing run proves nothing. @param {Totals} totals */
export const exitCodeOf = ({ passed, failed }) => (failed === 0 && passed > 0 ? 0 : 1);

/**
 * @typedef {object} VitestReport what its json reporter writes
 * @property {number} numPassedTests
 * @property {number} numTotalTests
 * @property {{ status: string, assertionResults: { status: string }[] }[]} testResults
 */

/**
 * A test that did not run proves nothing, so it counts as failed; so does a file that failed before its first test.
 * @param {VitestReport} report
 * @returns {Totals}
 */
export function countVitest(report) {
  const brokenFiles = report.testResults.filter(
    (file) => file.status === "failed" && !file.assertionResults.some((test) => test.status === "failed"),
  );
  return {
    passed: report.numPassedTests,
    failed: report.numTotalTests - report.numPassedTests + brokenFiles.length,
  };
}

/**
 * @typedef {object} PlaywrightReport what its json reporter writes
 * @property {{ expected: number, unexpected: number, flaky: number, skipped: number }} stats
 * @property {unknown[]} errors outside any test
 */

/** @param {PlaywrightReport} report @returns {Totals} */
export const countPlaywright = ({ stats, errors }) => ({
  passed: stats.expected,
  failed: stats.unexpected + stats.flaky + stats.skipped + errors.length,
});

/**
 * The totals of a runner that has ended. One that ended badly without saying what failed counts as one failure.
 * @template Report
 * @param {string} file where it should have written its report
 * @param {number} exitCode
 * @param {(report: Report) => Totals} count
 * @returns {Totals}
 */
export function readTotals(file, exitCode, count) {
  const totals = readReport(file, count);
  return exitCode !== 0 && totals.failed === 0 ? { ...totals, failed: 1 } : totals;
}

/** @template Report @param {string} file @param {(report: Report) => Totals} count @returns {Totals} */
function readReport(file, count) {
  try {
    return count(JSON.parse(readFileSync(file, "utf8")));
  } catch {
    return { passed: 0, failed: 1 };
  }
}
