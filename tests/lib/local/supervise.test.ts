import { existsSync, mkdtempSync, readFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { expect, it, vi } from "vitest";
import { readBook } from "@/lib/local/pids.mjs";
import { readStartTime } from "@/lib/local/processes.mjs";
import { countRecent, superviseService } from "@/lib/local/supervise.mjs";

function supervise(script: string, giveUp = vi.fn()) {
  const folder = mkdtempSync(join(tmpdir(), "ringwright-supervise-"));
  const pidsFile = join(folder, "pids.json");
  const service = {
    name: "worker",
    args: ["-e", script],
    env: process.env,
    logFile: join(folder, "worker.log"),
  };
  const running = superviseService(service, { cwd: folder, pidsFile, giveUp });
  return { ...running, pid: () => readBook(pidsFile).processes.worker?.pid ?? 0, log: service.logFile };
}

const forever = "console.log('here'); setInterval(() => undefined, 1000)";

it("a worker that crashes is started again, and the record names the new one", async () => {
  const worker = supervise(forever);
  const first = worker.pid();
  process.kill(first, "SIGKILL");
  await vi.waitUntil(() => ![0, first].includes(worker.pid()), { timeout: 10_000 });
  expect(readStartTime(worker.pid())).not.toBeNull();
  await worker.stop();
});

it("a worker that was told to stop is not started again", async () => {
  const worker = supervise(forever);
  const pid = worker.pid();
  await worker.stop();
  expect(readStartTime(pid)).toBeNull();
  await vi.waitUntil(() => worker.pid() === 0);
});

it("what a service prints goes to its log", async () => {
  const worker = supervise(forever);
  await vi.waitUntil(() => existsSync(worker.log) && readFileSync(worker.log, "utf8") === "here\n", {
    timeout: 10_000,
  });
  await worker.stop();
});

it("five ends within a minute are too many, and older ones are forgiven", async () => {
  expect(countRecent([0, 10_000, 70_000, 71_000], 71_500)).toBe(2);
  const giveUp = vi.fn();
  supervise("process.exit(3)", giveUp);
  await vi.waitUntil(() => giveUp.mock.calls.length > 0, { timeout: 30_000 });
  expect(giveUp).toHaveBeenCalledExactlyOnceWith("worker");
});
