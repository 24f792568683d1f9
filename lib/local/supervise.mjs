import { spawn } from "node:child_process";
import { mkdirSync, openSync } from "node:fs";
import { dirname } from "node:path";
import { forgetPid, recordPid, stopNamed } from "./pids.mjs";

const RESTART_AFTER_MS = 1000;
const TOO_MANY = 5;
const WITHIN_MS = 60_000;

/**
 * @typedef {object} Service
 * @property {string} name web, worker or mail
 * @property {string[]} args for node
 * @property {NodeJS.ProcessEnv} env
 * @property {string} logFile
 */

/**
 * Keeps one service running: should it end by itself it is started again a second later, until it has ended five
 * times within a minute. Then `giveUp` is called once.
 * @param {Service} service
 * @param {{ cwd: string, pidsFile: string, giveUp: (name: string) => void }} context
 * @returns {{ stop: () => Promise<void> }}
 */
export function superviseService(service, { cwd, pidsFile, giveUp }) {
  mkdirSync(dirname(service.logFile), { recursive: true });
  const log = openSync(service.logFile, "w", 0o600);
  /** @type {number[]} */
  const ends = [];
  /** @type {import("./processes.mjs").ProcessMark | undefined} */
  let mark;
  /** @type {NodeJS.Timeout | undefined} */
  let restart;
  let stopping = false;

  const start = () => {
    const stdio = /** @type {const} */ (["ignore", log, log]);
    const child = spawn(process.execPath, service.args, {
      cwd,
      env: service.env,
      detached: true,
      stdio: [...stdio],
    });
    mark = recordPid(pidsFile, service.name, child.pid ?? 0);
    child.once("exit", onEnd);
  };
  const onEnd = () => {
    forgetPid(pidsFile, service.name);
    if (stopping) return;
    ends.push(Date.now());
    if (countRecent(ends, Date.now()) >= TOO_MANY) return giveUp(service.name);
    restart = setTimeout(start, RESTART_AFTER_MS);
  };
  const stop = async () => {
    stopping = true;
    clearTimeout(restart);
    if (mark) await stopNamed(service.name, mark);
  };
  start();
  return { stop };
}

/** @param {number[]} ends @param {number} now */
export const countRecent = (ends, now) => ends.filter((end) => now - end <= WITHIN_MS).length;
