import { availableParallelism } from "node:os";
import { join } from "node:path";
import { findBrokenPaths } from "./document-paths.mjs";
import { root } from "./folders.mjs";
import { checkMigrations } from "./migrations-current.mjs";
import { runCommand } from "./processes.mjs";
import { formatSeconds } from "./progress.mjs";

/** @typedef {{ code: number, output: string }} Outcome */
/** @typedef {(signal?: AbortSignal) => Promise<Outcome>} Check */
/** @typedef {{ name: string, run: Check }} VerifyStep */

const LAYERS = ["app", "components", "lib", "db", "render", "tests"];
const LINT_CACHE = "--cache-location=node_modules/.cache/eslint/";

/** @param {string} path within node_modules @param {string[]} args @returns {Check} */
const tool = (path, ...args) => {
  const command = { command: process.execPath, args: [join("node_modules", path), ...args] };
  return (signal) => runCommand({ ...command, options: { cwd: root, signal } });
};

// Next writes the declarations for style sheets, images and routes, which a fresh clone does not have.
const generateTypes = tool("next/dist/bin/next", "typegen");
const checkTypes = tool("typescript/bin/tsc", "--noEmit");

/** @type {Check} */
const generateAndCheckTypes = async (signal) => {
  const generated = await generateTypes(signal);
  return generated.code === 0 ? checkTypes(signal) : generated;
};

/** @type {Check} */
const checkDocuments = async () => {
  const broken = findBrokenPaths(root, ["README.md", "DEVELOPERS.md"]);
  return { code: broken.length > 0 ? 1 : 0, output: broken.join("\n") };
};

/** Longest first, so that two cores end together. @type {VerifyStep[]} */
const steps = [
  { name: "types", run: generateAndCheckTypes },
  { name: "lint", run: tool("eslint/bin/eslint.js", ".", "--max-warnings=0", "--cache", LINT_CACHE) },
  { name: "format", run: tool("prettier/bin/prettier.cjs", "--check", "--cache", "--log-level=warn", ".") },
  {
    name: "import direction",
    run: tool(
      "dependency-cruiser/bin/dependency-cruise.mjs",
      ...LAYERS,
      "--config",
      ".dependency-cruiser.cjs",
    ),
  },
  { name: "dead code", run: tool("knip/bin/knip.js", "--no-progress") },
  { name: "migrations", run: () => checkMigrations(root) },
  { name: "document paths", run: checkDocuments },
];

/**
 * Runs every step, as many at once as there are cores, and prints a line for each.
 * @param {AbortSignal} [signal]
 * @returns {Promise<import("./totals.mjs").Totals>} each step counts as one check
 */
export async function runVerify(signal) {
  const waiting = [...steps];
  const totals = { passed: 0, failed: 0 };
  const work = async () => {
    for (let next = waiting.shift(); next && !signal?.aborted; next = waiting.shift()) {
      const passed = await reportStep(next, signal);
      if (passed) totals.passed += 1;
      else totals.failed += 1;
    }
  };
  await Promise.all(Array.from({ length: availableParallelism() }, work));
  return totals;
}

/** @param {VerifyStep} step @param {AbortSignal} [signal] */
async function reportStep({ name, run }, signal) {
  const began = performance.now();
  const { code, output } = await run(signal);
  const took = formatSeconds(performance.now() - began);
  console.log(
    code === 0
      ? `verify: ${name} passed (${took}).`
      : `verify: ${name} failed (${took}).\n${output.trim()}\n`,
  );
  return code === 0;
}
