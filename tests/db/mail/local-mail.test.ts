import { spawn } from "node:child_process";
import { once } from "node:events";
import { mkdtempSync } from "node:fs";
import { readdir, rm } from "node:fs/promises";
import { createServer, type AddressInfo } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { eq } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { outbox } from "@/db/schema/events";
import { environment } from "@/lib/environment";
import { readLocalMail } from "@/lib/mail/read-local";
import { startMailRelay } from "@/lib/mail/relay";
import { queueMail } from "@/lib/queue/outbox";
import { prepareEnvironment } from "../../support/links";
import { codeOf } from "../../support/refusals";
import { openStudio, type Studio } from "../../support/studio";
import { until } from "../../support/worker";

const root = join(import.meta.dirname, "..", "..", "..");
const folder = mkdtempSync(join(tmpdir(), "ringwright-mail-"));
let studio: Studio;
let port: number;
beforeAll(async () => {
  studio = await openStudio();
  port = await freePort();
  prepareEnvironment(studio.url);
  Object.assign(process.env, {
    SMTP_URL: `smtp://127.0.0.1:${port}`,
    MAIL_DIR: folder,
    RINGWRIGHT_LOCAL: "1",
  });
});
afterAll(async () => {
  await studio.close();
  await rm(folder, { recursive: true });
});

async function freePort(): Promise<number> {
  const probe = createServer().listen(0, "127.0.0.1");
  await once(probe, "listening");
  const { port } = probe.address() as AddressInfo;
  probe.close();
  await once(probe, "close");
  return port;
}

const queue = (key: string) =>
  studio.db.transaction((tx) =>
    queueMail(tx, key, {
      to: "odo@ringwright.example",
      subject: `About ${key}`,
      paragraphs: [`It is ${key}.`],
    }),
  );
const isDone = async (key: string) =>
  (
    await studio.db
      .select()
      .from(outbox)
      .where(eq(outbox.key, `mail ${key}`))
  )[0]!.doneAt !== null;

describe("local mail", () => {
  it("shows its owner that nothing was sent yet", async () => {
    expect(await readLocalMail(studio.as.owner)).toEqual({ letters: [], total: 0 });
  });

  it("goes from the outbox through the relay and the mail server's process to the owner's page", async () => {
    const server = spawn(process.execPath, ["--import", "tsx", "lib/mail/local-server.ts"], {
      cwd: root,
      env: { ...process.env, LOG_LEVEL: "silent" },
      stdio: ["ignore", "pipe", "inherit"],
    });
    const exited = once(server, "exit");
    const ending = new AbortController();
    const relay = startMailRelay(studio.db, ending.signal);
    await queue("first");
    await until(async () => {
      // The server may not have been there yet at the first try: ask again at once rather than after the wait.
      await studio.db.update(outbox).set({ dueAt: new Date() });
      return isDone("first");
    });
    const { letters, total } = await readLocalMail(studio.as.owner);
    expect(total).toBe(1);
    expect(letters[0]).toMatchObject({ subject: "About first", to: ["odo@ringwright.example"] });
    expect(letters[0]!.text).toContain("It is first.");
    ending.abort();
    await relay;
    server.kill("SIGTERM");
    expect(await exited).toEqual([0, null]);
    expect((await readdir(folder)).filter((name) => !name.endsWith(".json"))).toEqual([]);
  });

  it("is shown to the studio's owner alone", async () => {
    for (const who of ["producer", "advisor", "artist", "client"] as const)
      expect(await codeOf(readLocalMail(studio.as[who])), who).toBe("forbidden");
  });

  it("is not there at all where mail goes out into the world", async () => {
    environment().RINGWRIGHT_LOCAL = "0";
    expect(await codeOf(readLocalMail(studio.as.owner))).toBe("not-found");
    environment().RINGWRIGHT_LOCAL = "1";
  });
});
