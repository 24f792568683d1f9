import { mkdirSync } from "node:fs";
import { join } from "node:path";
import { setTimeout as pause } from "node:timers/promises";
import { Refusal } from "./refusal.mjs";
import { superviseService } from "./supervise.mjs";
import { readTail } from "./task.mjs";

const READY_WITHIN_MS = 90_000;

/**
 * @typedef {object} StudioContext
 * @property {string} root
 * @property {import("./folders.mjs").Folders} folders
 * @property {NodeJS.ProcessEnv} env
 * @property {AbortSignal} signal
 * @property {(stop: () => Promise<void>) => void} onStop told each service's stop, in the order of their starts
 * @property {(reason: Refusal) => void} giveUp called when a service keeps ending
 */

/**
 * Starts mail server, worker and web, and answers with the address once the web says that it is ready.
 * @param {StudioContext} context
 */
export async function raiseStudio(context) {
  const { root, folders, env } = context;
  for (const folder of [folders.storage, folders.mail]) mkdirSync(folder, { recursive: true, mode: 0o700 });
  /** @type {Refusal | undefined} */
  let failure;
  const giveUp = (/** @type {string} */ name) => {
    const log = join(folders.logs, `${name}.log`);
    failure = new Refusal(
      `The ${name} ended five times within a minute. Its log (${log}) ends with:\n${readTail(log)}`,
    );
    context.giveUp(failure);
  };
  for (const { name, args } of listServices(env)) {
    const service = { name, args, env, logFile: join(folders.logs, `${name}.log`) };
    const running = superviseService(service, { cwd: root, pidsFile: folders.pids, giveUp });
    context.onStop(running.stop);
  }
  await waitUntilReady(
    `${env.NEXTAUTH_URL}/api/ready`,
    () => failure,
    context.signal,
    join(folders.logs, "web.log"),
  );
  return String(env.NEXTAUTH_URL);
}

/** @param {NodeJS.ProcessEnv} env */
const listServices = (env) => [
  { name: "mail", args: ["--import", "tsx", "lib/mail/local-server.ts"] },
  { name: "worker", args: ["--import", "tsx", "lib/renders/worker.ts"] },
  {
    name: "web",
    args: ["node_modules/next/dist/bin/next", "start", "-H", "127.0.0.1", "-p", String(env.PORT)],
  },
];

/**
 * @param {string} url
 * @param {() => Refusal | undefined} failure
 * @param {AbortSignal} signal
 * @param {string} logFile
 */
async function waitUntilReady(url, failure, signal, logFile) {
  const until = Date.now() + READY_WITHIN_MS;
  let last = "no answer";
  while (Date.now() < until) {
    if (signal.aborted) throw new Refusal("Stopped.");
    const failed = failure();
    if (failed) throw failed;
    const answer = await fetch(url, { signal: AbortSignal.timeout(5000) }).catch(() => null);
    if (answer?.status === 200) return;
    if (answer) last = `${answer.status} ${(await answer.text()).slice(0, 300)}`;
    await pause(100);
  }
  throw new Refusal(
    `${url} was not ready within 90 s; it last said: ${last}. ${logFile} ends with:\n${readTail(logFile)}`,
  );
}
