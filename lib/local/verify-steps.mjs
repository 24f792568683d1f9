import { availableParallelism } from "node:os";
import { join } from "node:path";
import { findBrokenPaths } from "./document-paths.mjs";
import { root } from "./folders.mjs";
import { checkMigrations } from "./migrations-current.mjs";
import { runCommand } from "./processes.mjs";
import { formatSeconds } from "./progress.mjs";

/** @typedef {{ code: number, output: string }} Outcome */
/** @typedef {{ name: string, run: () => Promise<Outcome> }} VerifyStep */

const LAYERS = ["app", "components", "lib", "db", "render", "tests"];
const CACHE = join("node_modules", ".cache");

/** @param {string} path within node_modules @param {string[]} args */
const runTool = (path, ...args) =>
  runCommand({
    command: process.execPath,
    args: [join("node_modules", path), ...args],
    options: { cwd: root },
  });

async function checkTypes() {
  // Next writes the declarations for style sheets, images and routes, which a fresh clone does not have.
  const generated = await runTool("next/dist/bin/next", "typegen");
  return generated.code === 0 ? runTool("typescript/bin/tsc", "--noEmit") : generated;
}

async function checkDocuments() {
  const broken = findBrokenPaths(root, ["README.md", "DEVELOPERS.md"]);
  return { code: broken.length > 0 ? 1 : 0, output: broken.join("\n") };
}

/** Longest first, so that two cores end together. @type {VerifyStep[]} */
const steps = [
  { name: "types", run: checkTypes },
  {
    name: "lint",
    run: () =>
      runTool(
        "eslint/bin/eslint.js",
        ".",
        "--max-warnings=0",
        "--cache",
        `--cache-location=${join(CACHE, "eslint", "/")}`,
      ),
  },
  {
    name: "format",
    run: () => runTool("prettier/bin/prettier.cjs", "--check", "--cache", "--log-level=warn", "."),
  },
  {
    name: "import direction",
    run: () =>
      runTool(
        "dependency-cruiser/bin/dependency-cruise.mjs",
        ...LAYERS,
        "--config",
        ".dependency-cruiser.cjs",
      ),
  },
  { name: "dead code", run: () => runTool("knip/bin/knip.js", "--no-progress") },
  { name: "migrations", run: () => checkMigrations(root) },
  { name: "document paths", run: checkDocuments },
];

/**
 * Runs every step, as many at once as there are cores, and prints a line for each.
 * @returns {Promise<import("./totals.mjs").Totals>} each step counts as one check
 */
export async function runVerify() {
  const waiting = [...steps];
  const totals = { passed: 0, failed: 0 };
  const work = async () => {
    for (let next = waiting.shift(); next; next = waiting.shift()) {
      const passed = await reportStep(next);
      if (passed) totals.passed += 1;
      else totals.failed += 1;
    }
  };
  await Promise.all(Array.from({ length: availableParallelism() }, work));
  return totals;
}

/** @param {VerifyStep} step */
async function reportStep({ name, run }) {
  const began = performance.now();
  const { code, output } = await run();
  const took = formatSeconds(performance.now() - began);
  console.log(
    code === 0
      ? `verify: ${name} passed (${took}).`
      : `verify: ${name} failed (${took}).\n${output.trim()}\n`,
  );
  return code === 0;
}
