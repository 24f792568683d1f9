import { parseArgs } from "node:util";
import { Refusal } from "./refusal.mjs";

const START_USAGE = "npm start -- [--port N] [--fresh-demo] [--data DIR]";
const TEST_USAGE = "npm test -- [--only unit|db|e2e]";

/** @param {string[]} args */
export function parseStartOptions(args) {
  const values = parse(args, START_USAGE, {
    port: { type: "string" },
    "fresh-demo": { type: "boolean", default: false },
    data: { type: "string", default: ".data" },
  });
  const port = values.port === undefined ? null : Number(values.port);
  if (port !== null && !(Number.isInteger(port) && port >= 1 && port <= 65535)) {
    throw new Refusal(`--port is "${values.port}": give a whole number from 1 to 65535. ${START_USAGE}`);
  }
  return { port, freshDemo: values["fresh-demo"] === true, data: String(values.data) };
}

/** @param {string[]} args @returns {"all" | "unit" | "db" | "e2e"} */
export function parseTestOptions(args) {
  const { only } = parse(args, TEST_USAGE, { only: { type: "string" } });
  if (only === undefined) return "all";
  if (only === "unit" || only === "db" || only === "e2e") return only;
  throw new Refusal(`--only is "${only}": it takes unit, db or e2e. ${TEST_USAGE}`);
}

/**
 * @param {string[]} args
 * @param {string} usage
 * @param {NonNullable<import("node:util").ParseArgsConfig["options"]>} options
 */
function parse(args, usage, options) {
  try {
    return parseArgs({ args, options }).values;
  } catch (error) {
    throw new Refusal(`${error instanceof Error ? error.message : error}\n${usage}`);
  }
}
