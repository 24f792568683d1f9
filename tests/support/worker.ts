// A real worker process, as `npm start` runs it.
import { spawn, type ChildProcess } from "node:child_process";
import { once } from "node:events";
import { join } from "node:path";

const root = join(import.meta.dirname, "..", "..");

export interface WorkerProcess {
  /** Sends the signal and answers with the exit code, null when the signal itself ended the process. */
  end(signal: NodeJS.Signals): Promise<number | null>;
}

export function startWorker(environment: { DATABASE_URL: string; STORAGE_DIR: string }): WorkerProcess {
  const child: ChildProcess = spawn(process.execPath, ["--import", "tsx", "lib/renders/worker.ts"], {
    cwd: root,
    env: { ...process.env, LOG_LEVEL: "silent", SMTP_URL: "", ...environment },
    stdio: ["ignore", "ignore", "inherit"],
  });
  const ended = once(child, "exit");
  return {
    async end(signal) {
      child.kill(signal);
      const [code] = (await ended) as [number | null];
      return code;
    },
  };
}

/** Asks until the answer is yes; the test's own time limit ends a wait in vain. */
export async function until(question: () => Promise<boolean>): Promise<void> {
  while (!(await question())) await new Promise((resolve) => setTimeout(resolve, 50));
}
