import { spawnSync } from "node:child_process";
import { closeSync, mkdirSync, openSync } from "node:fs";
import { dirname } from "node:path";

/**
 * Takes the kernel's lock on a file, which ends with this process however it ends: nothing stale is ever left.
 * flock(1) locks the open file it is handed, and that stays locked here after flock itself has gone.
 * @param {string} file
 * @param {{ waitSeconds?: number }} [how] 0 answers at once
 * @returns {(() => void) | null} gives the lock back; null when another process holds it
 */
export function takeLock(file, { waitSeconds = 0 } = {}) {
  mkdirSync(dirname(file), { recursive: true, mode: 0o711 });
  const descriptor = openSync(file, "a", 0o600);
  const wait = waitSeconds > 0 ? ["-w", String(waitSeconds)] : ["-n"];
  const { status } = spawnSync("flock", [...wait, "3"], {
    stdio: ["ignore", "ignore", "ignore", descriptor],
  });
  if (status === 0) return () => closeSync(descriptor);
  closeSync(descriptor);
  return null;
}
