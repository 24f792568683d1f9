import { spawnSync } from "node:child_process";
import { mkdtempSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { expect, it } from "vitest";
import { takeLock } from "@/lib/local/lock.mjs";

const newFile = () => join(mkdtempSync(join(tmpdir(), "ringwright-lock-")), "launcher.lock");

it("the second of two starts is refused while the first holds the folder, and served after", () => {
  const file = newFile();
  const release = takeLock(file);
  expect(release).toBeTypeOf("function");
  expect(takeLock(file)).toBeNull();
  release?.();
  expect(takeLock(file)).toBeTypeOf("function");
});

it("a launcher that was killed leaves no lock behind", () => {
  const file = newFile();
  const lock = join(import.meta.dirname, "..", "..", "..", "lib", "local", "lock.mjs");
  const script = `import { takeLock } from ${JSON.stringify(lock)};
    process.stdout.write(takeLock(${JSON.stringify(file)}) ? "held" : "refused");
    process.kill(process.pid, "SIGKILL");`;
  const killed = spawnSync(process.execPath, ["--input-type=module", "-e", script], { encoding: "utf8" });
  expect([killed.stdout, killed.signal]).toEqual(["held", "SIGKILL"]);
  expect(takeLock(file)).toBeTypeOf("function");
});
