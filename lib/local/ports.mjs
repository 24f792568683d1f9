import { readFileSync, writeFileSync } from "node:fs";
import { createServer } from "node:net";
import { Refusal } from "./refusal.mjs";

/**
 * The only honest probe is to listen: answers with the port taken, or null when it is in use.
 * @param {number} port 0 lets the system choose
 * @returns {Promise<number | null>}
 */
export function tryPort(port) {
  return new Promise((resolve) => {
    const server = createServer();
    server.once("error", () => resolve(null));
    server.listen({ port, host: "127.0.0.1", exclusive: true }, () => {
      const address = server.address();
      server.close(() => resolve(typeof address === "object" && address ? address.port : null));
    });
  });
}

const WEB_PORT = 3000;

/**
 * The port asked for, which must be free; without a wish 3000, or the next that is free.
 * @param {number | null} wanted
 */
export async function chooseWebPort(wanted) {
  if (wanted === null) return findPortFrom(WEB_PORT);
  if (await tryPort(wanted)) return wanted;
  throw new Refusal(
    `Port ${wanted} is in use on 127.0.0.1. Give another, or leave --port away and the next free one is taken.`,
  );
}

/**
 * The first free port from `first` upwards, looking at a hundred of them.
 * @param {number} first
 */
export async function findPortFrom(first) {
  for (let port = first; port < first + 100; port += 1) {
    if (await tryPort(port)) return port;
  }
  throw new Error(`No port from ${first} to ${first + 99} is free on 127.0.0.1.`);
}

/**
 * A port that stays the same from start to start: kept in `file` under `name`, moved only when taken by another.
 * @param {string} file
 * @param {string} name
 */
export async function keepPort(file, name) {
  const kept = readPorts(file);
  const port = (kept[name] && (await tryPort(kept[name]))) || (await tryPort(0));
  if (!port) throw new Error("No port is free on 127.0.0.1.");
  writeFileSync(file, `${JSON.stringify({ ...kept, [name]: port }, null, 2)}\n`);
  return port;
}

/** @param {string} file @returns {Record<string, number>} */
function readPorts(file) {
  try {
    return JSON.parse(readFileSync(file, "utf8"));
  } catch {
    return {};
  }
}
