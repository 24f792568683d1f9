import { mkdtempSync } from "node:fs";
import { createServer, type AddressInfo } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { expect, it } from "vitest";
import { chooseWebPort, findPortFrom, keepPort, tryPort } from "@/lib/local/ports.mjs";

async function listening<T>(work: (port: number) => Promise<T>): Promise<T> {
  const server = createServer();
  await new Promise<void>((resolve) => server.listen(0, "127.0.0.1", resolve));
  try {
    return await work((server.address() as AddressInfo).port);
  } finally {
    await new Promise((resolve) => server.close(resolve));
  }
}

it("a port in use is passed over for the next that is free", async () => {
  await listening(async (port) => {
    expect(await tryPort(port)).toBeNull();
    expect(await findPortFrom(port)).toBeGreaterThan(port);
  });
});

it("a port asked for by name is refused when in use, rather than quietly moved", async () => {
  await listening(async (port) => {
    await expect(chooseWebPort(port)).rejects.toThrow(`Port ${port} is in use`);
  });
});

it("a kept port stays from start to start and moves only when another holds it", async () => {
  const file = join(mkdtempSync(join(tmpdir(), "ringwright-ports-")), "ports.json");
  const first = await keepPort(file, "database");
  expect(await keepPort(file, "mail")).not.toBe(first);
  expect(await keepPort(file, "database")).toBe(first);
  const server = createServer().listen(first, "127.0.0.1");
  await new Promise((resolve) => server.once("listening", resolve));
  expect(await keepPort(file, "database")).not.toBe(first);
  await new Promise((resolve) => server.close(resolve));
});
