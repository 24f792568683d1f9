import { readFileSync, renameSync, writeFileSync } from "node:fs";
import { isRunning, readStartTime, stopProcess } from "./processes.mjs";

/** @typedef {import("./processes.mjs").ProcessMark} ProcessMark */
/** @typedef {{ boot: string, processes: Record<string, ProcessMark> }} PidBook */

/** Whoever serves people stops first, whoever keeps the data last. A task is a step of a start that was cut short. */
const STOP_ORDER = ["task", "web", "worker", "mail", "database"];

/**
 * Which recorded processes may be stopped: those that still are what was recorded. A pid that now belongs to another
 * process, by its start time or because the machine was started again, is left alone.
 * @param {PidBook} book
 * @param {string} boot
 * @param {(mark: ProcessMark) => boolean} running
 */
export function chooseLeftovers(book, boot, running) {
  if (book.boot !== boot) return [];
  const rank = (/** @type {string} */ name) =>
    (STOP_ORDER.indexOf(name) + STOP_ORDER.length + 1) % (STOP_ORDER.length + 1);
  return Object.entries(book.processes)
    .filter(([, mark]) => running(mark))
    .sort(([a], [b]) => rank(a) - rank(b))
    .map(([name, mark]) => ({ name, mark }));
}

/**
 * Stops what a killed launcher left running.
 * @param {string} file
 * @returns {Promise<string[]>} the names of what was stopped
 */
export async function reapLeftovers(file) {
  const leftovers = chooseLeftovers(readBook(file), readBoot(), isRunning);
  for (const { name, mark } of leftovers) await stopNamed(name, mark);
  writeBook(file, { boot: readBoot(), processes: {} });
  return leftovers.map(({ name }) => name);
}

/** @param {string} name @param {ProcessMark} mark */
export const stopNamed = (name, mark) =>
  // The database's own processes are its business: it is told once, politely (a fast shutdown), and given time.
  name === "database"
    ? stopProcess(mark, { signal: "SIGINT", group: false, patienceMs: 60_000 })
    : stopProcess(mark, { patienceMs: 15_000 });

/** @param {string} file @param {string} name @param {number} pid */
export function recordPid(file, name, pid) {
  const mark = { pid, startTime: readStartTime(pid) ?? "" };
  const book = readBook(file);
  writeBook(file, { boot: readBoot(), processes: { ...book.processes, [name]: mark } });
  return mark;
}

/** @param {string} file @param {string} name */
export function forgetPid(file, name) {
  const processes = Object.fromEntries(
    Object.entries(readBook(file).processes).filter(([known]) => known !== name),
  );
  writeBook(file, { boot: readBoot(), processes });
}

/** @param {string} file @returns {PidBook} */
export function readBook(file) {
  try {
    return JSON.parse(readFileSync(file, "utf8"));
  } catch {
    return { boot: "", processes: {} };
  }
}

/** Renamed into place, so that a launcher killed while writing leaves the old book whole. @param {string} file @param {PidBook} book */
function writeBook(file, book) {
  writeFileSync(`${file}.new`, `${JSON.stringify(book, null, 2)}\n`);
  renameSync(`${file}.new`, file);
}

const readBoot = () => readFileSync("/proc/sys/kernel/random/boot_id", "utf8").trim();
