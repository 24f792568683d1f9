import { spawn } from "node:child_process";
import {
  chmodSync,
  chownSync,
  existsSync,
  mkdirSync,
  openSync,
  readFileSync,
  renameSync,
  rmSync,
  writeFileSync,
} from "node:fs";
import { dirname, join } from "node:path";
import { setTimeout as pause } from "node:timers/promises";
import { keepPort } from "./ports.mjs";
import { choosePlace } from "./postgres-place.mjs";
import { choosePrograms } from "./postgres-programs.mjs";
import { readStartTime, runCommand, stopProcess } from "./processes.mjs";
import { Refusal } from "./refusal.mjs";

/**
 * @typedef {object} ClusterOptions
 * @property {string} folder where the cluster lives, absolute
 * @property {string} password of the superuser `postgres`
 * @property {string} portsFile where the port is kept
 * @property {string} logFile
 * @property {string[]} [settings] further `-c` settings
 */
/** @typedef {{ programs: string, port: number, password: string, mark: import("./processes.mjs").ProcessMark, startedHere: boolean, note?: string }} Cluster */

/**
 * A running cluster on 127.0.0.1: the one already running in that folder, or a new server over it, made when missing.
 * @param {ClusterOptions} options
 * @returns {Promise<Cluster>}
 */
export async function ensureCluster(options) {
  const place = choosePlace(options.folder);
  const programs = choosePrograms(place.folder);
  const shared = { programs, password: options.password, note: place.note };
  const running = findPostmaster(place.folder);
  if (running) {
    await waitUntilReady(programs, running.port, running.mark, options.logFile);
    return { ...shared, ...running, startedHere: false };
  }
  if (!existsSync(join(place.folder, "PG_VERSION"))) await makeCluster(place, programs, options.password);
  const port = await keepPort(options.portsFile, "database");
  const mark = startPostmaster(place, programs, port, options);
  await waitUntilReady(programs, port, mark, options.logFile);
  return { ...shared, port, mark, startedHere: true };
}

/**
 * The server running over a cluster folder, as its own postmaster.pid says, checked against the process itself.
 * @param {string} folder
 */
export function findPostmaster(folder) {
  try {
    const [pidLine, , , portLine] = readFileSync(join(folder, "postmaster.pid"), "utf8").split("\n");
    const pid = Number(pidLine);
    const startTime = readStartTime(pid);
    const ours = readFileSync(`/proc/${pid}/cmdline`, "utf8").split("\0").includes(folder);
    return startTime && ours ? { port: Number(portLine), mark: { pid, startTime } } : null;
  } catch {
    return null;
  }
}

/**
 * A fast shutdown: sessions are ended, everything is written, nothing is left to recover.
 * @param {import("./processes.mjs").ProcessMark} mark
 */
export const stopCluster = (mark) =>
  stopProcess(mark, { signal: "SIGINT", group: false, patienceMs: 60_000 });

/**
 * Made beside its place and moved there when whole, so that an interrupted start leaves no half-made cluster.
 * @param {import("./postgres-place.mjs").Place} place
 * @param {string} programs
 * @param {string} password
 */
async function makeCluster(place, programs, password) {
  const half = `${place.folder}.unfinished`;
  const passwordFile = `${place.folder}.password`;
  rmSync(half, { recursive: true, force: true });
  mkdirSync(half, { recursive: true, mode: 0o700 });
  writeFileSync(passwordFile, `${password}\n`, { mode: 0o600 });
  if (place.account)
    for (const path of [half, passwordFile]) chownSync(path, place.account.uid, place.account.gid);
  const args = ["-D", half, "-U", "postgres", "-E", "UTF8", "--locale=C.UTF-8", "-A", "scram-sha-256"];
  const made = await runCommand(place.wrap(join(programs, "initdb"), [...args, `--pwfile=${passwordFile}`]));
  rmSync(passwordFile, { force: true });
  if (made.code !== 0) throw new Error(`initdb could not make the database in ${half}:\n${made.output}`);
  renameSync(half, place.folder);
}

/**
 * Started detached, so that Ctrl-C reaches the launcher alone and the database stops last.
 * @param {import("./postgres-place.mjs").Place} place
 * @param {string} programs
 * @param {number} port
 * @param {ClusterOptions} options
 */
function startPostmaster(place, programs, port, options) {
  const settings = [
    "listen_addresses=127.0.0.1",
    "unix_socket_directories=",
    "logging_collector=off",
    ...(options.settings ?? []),
  ];
  const args = ["-D", place.folder, "-p", String(port), ...settings.flatMap((setting) => ["-c", setting])];
  mkdirSync(dirname(options.logFile), { recursive: true });
  const log = openSync(options.logFile, "w", 0o600);
  chmodSync(place.folder, 0o700);
  const wrapped = place.wrap(join(programs, "postgres"), args);
  const child = spawn(wrapped.command, wrapped.args, {
    ...wrapped.options,
    detached: true,
    stdio: ["ignore", log, log],
  });
  child.on("error", () => undefined);
  child.unref();
  const pid = child.pid ?? 0;
  return { pid, startTime: readStartTime(pid) ?? "" };
}

/**
 * @param {string} programs
 * @param {number} port
 * @param {import("./processes.mjs").ProcessMark} mark
 * @param {string} logFile
 */
async function waitUntilReady(programs, port, mark, logFile) {
  const ask = { command: join(programs, "pg_isready"), args: ["-q", "-h", "127.0.0.1", "-p", String(port)] };
  for (let tries = 0; tries < 1200; tries += 1) {
    if ((await runCommand(ask)).code === 0) return;
    if (readStartTime(mark.pid) !== mark.startTime) break;
    await pause(50);
  }
  const log = existsSync(logFile)
    ? readFileSync(logFile, "utf8").trimEnd().split("\n").slice(-20).join("\n")
    : "";
  throw new Refusal(`PostgreSQL did not start on 127.0.0.1:${port}. Its log (${logFile}) ends with:\n${log}`);
}
