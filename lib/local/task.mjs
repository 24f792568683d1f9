import { spawn } from "node:child_process";
import { closeSync, mkdirSync, openSync, readFileSync } from "node:fs";
import { dirname } from "node:path";
import { forgetPid, recordPid, stopNamed } from "./pids.mjs";
import { Refusal } from "./refusal.mjs";

/**
 * @typedef {object} TaskContext
 * @property {string} cwd
 * @property {string} pidsFile
 * @property {AbortSignal} signal stops the task with all its children
 * @property {NodeJS.ProcessEnv} [env]
 */

/**
 * Runs one step of a start to its end and answers with its exit code. It is recorded, so that the next start can stop
 * it should this one be killed.
 * @param {TaskContext} context
 * @param {string[]} command
 * @param {string} [logFile] where its output goes; without one it is shown
 * @returns {Promise<number>}
 */
export async function runTask(context, [program = "", ...args], logFile) {
  if (context.signal.aborted) throw new Refusal("Stopped.");
  if (logFile) mkdirSync(dirname(logFile), { recursive: true });
  const out = logFile ? openSync(logFile, "w", 0o600) : "inherit";
  const env = context.env ?? process.env;
  const child = spawn(program, args, { cwd: context.cwd, env, detached: true, stdio: ["ignore", out, out] });
  /** @type {Promise<number>} */
  const ended = new Promise((resolve) => {
    child.once("error", () => resolve(127));
    child.once("exit", (code) => resolve(code ?? 1));
  });
  const stop = () => child.pid && void stopNamed("task", recordPid(context.pidsFile, "task", child.pid));
  context.signal.addEventListener("abort", stop, { once: true });
  if (child.pid) recordPid(context.pidsFile, "task", child.pid);
  const code = await ended;
  context.signal.removeEventListener("abort", stop);
  forgetPid(context.pidsFile, "task");
  if (typeof out === "number") closeSync(out);
  if (context.signal.aborted) throw new Refusal("Stopped.");
  return code;
}

/**
 * As runTask, but a failure is a reason to stop, told with the end of what the task printed.
 * @param {TaskContext} context
 * @param {string[]} command
 * @param {string} failure a sentence without its full stop
 * @param {string} [logFile]
 */
export async function mustRun(context, command, failure, logFile) {
  const code = await runTask(context, command, logFile);
  if (code === 0) return;
  const tail = logFile ? ` Its log (${logFile}) ends with:\n${readTail(logFile)}` : " What it said is above.";
  throw new Refusal(`${failure} (exit code ${code}).${tail}`);
}

/** @param {string} file @param {number} [lines] */
export function readTail(file, lines = 30) {
  try {
    return readFileSync(file, "utf8").trimEnd().split("\n").slice(-lines).join("\n");
  } catch {
    return "";
  }
}
