import { spawn } from "node:child_process";
import { once } from "node:events";
import { mkdtempSync, readFileSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { expect, it } from "vitest";
import { chooseLeftovers, forgetPid, readBook, reapLeftovers, recordPid } from "@/lib/local/pids.mjs";
import { isRunning, readStartTime, stopProcess } from "@/lib/local/processes.mjs";

const newFile = () => join(mkdtempSync(join(tmpdir(), "ringwright-pids-")), "pids.json");
const mark = (pid: number) => ({ pid, startTime: "100" });

function startSleeper() {
  const child = spawn(process.execPath, ["-e", "setInterval(() => undefined, 1000)"], {
    detached: true,
    stdio: "ignore",
  });
  return { pid: child.pid ?? 0, ended: once(child, "exit") };
}

it("what a killed launcher left is stopped web first and database last, whatever order it was recorded in", () => {
  const processes = { database: mark(1), mail: mark(2), web: mark(3), task: mark(4), worker: mark(5) };
  const chosen = chooseLeftovers({ boot: "b", processes }, "b", () => true);
  expect(chosen.map(({ name }) => name)).toEqual(["task", "web", "worker", "mail", "database"]);
});

it("a pid that now belongs to another process is left alone", () => {
  const other = { pid: process.pid, startTime: "1" };
  const own = { pid: process.pid, startTime: readStartTime(process.pid) ?? "" };
  const book = { boot: "b", processes: { web: other, worker: own } };
  expect(chooseLeftovers(book, "b", isRunning).map(({ name }) => name)).toEqual(["worker"]);
});

it("nothing recorded before the machine was started again is touched", () => {
  expect(chooseLeftovers({ boot: "before", processes: { web: mark(3) } }, "now", () => true)).toEqual([]);
});

it("the next start stops a recorded process that still runs, and empties the book", async () => {
  const file = newFile();
  const sleeper = startSleeper();
  recordPid(file, "worker", sleeper.pid);
  recordPid(file, "web", 2 ** 22 + 1);
  expect(await reapLeftovers(file)).toEqual(["worker"]);
  await sleeper.ended;
  expect(readStartTime(sleeper.pid)).toBeNull();
  expect(readBook(file).processes).toEqual({});
});

it("a service that ended is forgotten while the others stay recorded", () => {
  const file = newFile();
  recordPid(file, "web", process.pid);
  recordPid(file, "mail", process.pid);
  forgetPid(file, "web");
  expect(Object.keys(readBook(file).processes)).toEqual(["mail"]);
});

it("a damaged book stops nothing and is replaced", async () => {
  const file = newFile();
  writeFileSync(file, '{"boot": "half a');
  expect(await reapLeftovers(file)).toEqual([]);
  expect(JSON.parse(readFileSync(file, "utf8")).processes).toEqual({});
});

it("a process that will not listen is killed once patience is over", async () => {
  const deaf =
    "process.on('SIGTERM', () => undefined); setInterval(() => undefined, 1000); console.log('deaf')";
  const child = spawn(process.execPath, ["-e", deaf], {
    detached: true,
    stdio: ["ignore", "pipe", "ignore"],
  });
  await once(child.stdout, "data");
  const ended = once(child, "exit");
  const pid = child.pid ?? 0;
  const running = { pid, startTime: readStartTime(pid) ?? "" };
  expect(await stopProcess(running, { patienceMs: 200 })).toBe(true);
  expect(await ended).toEqual([null, "SIGKILL"]);
});
