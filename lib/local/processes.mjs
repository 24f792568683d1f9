import { spawn } from "node:child_process";
import { readFileSync } from "node:fs";
import { setTimeout as pause } from "node:timers/promises";

/** @typedef {{ command: string, args: string[], options?: import("node:child_process").SpawnOptions }} Command */
/** @typedef {{ pid: number, startTime: string }} ProcessMark a pid alone may be reused; with its start time it may not */

/**
 * When the process started, in clock ticks since boot (field 22 of /proc/PID/stat), or null when there is none.
 * A zombie counts as none: it has ended and only waits for its parent.
 * @param {number} pid
 */
export function readStartTime(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, "utf8");
    // The second field is the program's name in parentheses and may itself hold spaces and parentheses.
    const fields = stat.slice(stat.lastIndexOf(")") + 2).split(" ");
    return fields[0] === "Z" ? null : (fields[19] ?? null);
  } catch {
    return null;
  }
}

/** @param {ProcessMark} mark */
export const isRunning = (mark) => readStartTime(mark.pid) === mark.startTime;

/**
 * Runs a command to its end and answers with its exit code and everything it printed.
 * @param {Command} command
 * @returns {Promise<{ code: number, output: string }>}
 */
export function runCommand({ command, args, options = {} }) {
  return new Promise((resolve) => {
    const child = spawn(command, args, { stdio: ["ignore", "pipe", "pipe"], ...options });
    let output = "";
    child.stdout?.on("data", (chunk) => (output += chunk));
    child.stderr?.on("data", (chunk) => (output += chunk));
    child.once("error", (error) => resolve({ code: 127, output: error.message }));
    child.once("close", (code) => resolve({ code: code ?? 1, output }));
  });
}

/**
 * Asks a process to end, waits, and kills it when it has not ended in time.
 * @param {ProcessMark} mark
 * @param {{ signal?: NodeJS.Signals, group?: boolean, patienceMs?: number }} how `group` also reaches its children
 * @returns {Promise<boolean>} whether it was running
 */
export async function stopProcess(mark, { signal = "SIGTERM", group = true, patienceMs = 10_000 } = {}) {
  if (!isRunning(mark)) return false;
  const target = group ? -mark.pid : mark.pid;
  send(target, signal);
  for (let waited = 0; isRunning(mark) && waited < patienceMs; waited += 20) await pause(20);
  if (isRunning(mark)) send(target, "SIGKILL");
  while (isRunning(mark)) await pause(20);
  return true;
}

/** @param {number} target @param {NodeJS.Signals} signal */
function send(target, signal) {
  try {
    process.kill(target, signal);
  } catch {
    // It ended between the look and the signal.
  }
}
