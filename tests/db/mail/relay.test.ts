import { mkdtempSync } from "node:fs";
import { readdir, readFile, rm } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { eq, sql } from "drizzle-orm";
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from "vitest";
import { openDatabase } from "@/db/client";
import { outbox } from "@/db/schema/events";
import { localLetterSchema, type LocalLetter } from "@/lib/mail/local-letter";
import { openLocalPost, type LocalPost } from "@/lib/mail/local-post";
import { sendDueMail } from "@/lib/mail/relay";
import { openPost, type Post } from "@/lib/mail/send";
import { messageIdOf } from "@/lib/mail/write-letter";
import { queueMail } from "@/lib/queue/outbox";
import { prepareEnvironment } from "../../support/links";
import { openStudio, type Studio } from "../../support/studio";

const studioUrl = "http://127.0.0.1:3000";
let studio: Studio;
let folder: string;
let local: LocalPost;
let post: Post;
beforeAll(async () => {
  studio = await openStudio();
  prepareEnvironment(studio.url);
});
beforeEach(async () => {
  await studio.db.delete(outbox);
  folder = mkdtempSync(join(tmpdir(), "ringwright-mail-"));
  local = await openLocalPost(0, folder);
  post = openPost(`smtp://127.0.0.1:${local.port}`, "Ringwright <studio@ringwright.example>");
});
afterEach(async () => {
  post.close();
  await local.close();
  await rm(folder, { recursive: true });
});
afterAll(() => studio.close());

const queue = (key: string, to = "odo@ringwright.example") =>
  studio.db.transaction((tx) =>
    queueMail(tx, key, { to, subject: `About ${key}`, paragraphs: ["Grüße, “Odo”.", ".", "Third."] }),
  );
const rowOf = async (key: string) =>
  (
    await studio.db
      .select()
      .from(outbox)
      .where(eq(outbox.key, `mail ${key}`))
  )[0]!;
async function kept(): Promise<LocalLetter[]> {
  const names = (await readdir(folder)).sort();
  expect(names.every((name) => name.endsWith(".json"))).toBe(true);
  return Promise.all(
    names.map(async (name) =>
      localLetterSchema.parse(JSON.parse(await readFile(join(folder, name), "utf8"))),
    ),
  );
}
/** A mail server that is not there: the port of one that has just closed. */
async function deadPost(): Promise<Post> {
  const closed = await openLocalPost(0, folder);
  await closed.close();
  return openPost(`smtp://127.0.0.1:${closed.port}`, "studio@ringwright.example");
}

describe("the mail relay", () => {
  it("sends a queued letter through a real mail server, whole, and marks it done", async () => {
    await queue("a");
    expect(await sendDueMail(studio.db, post, studioUrl)).toBe(1);
    const [letter] = await kept();
    expect(letter).toMatchObject({
      to: ["odo@ringwright.example"],
      from: "Ringwright <studio@ringwright.example>",
      subject: "About a",
      messageId: messageIdOf("mail a"),
      text: `Grüße, “Odo”.\n\n.\n\nThird.\n\nSent by Ringwright at ${studioUrl}\n`,
    });
    expect(letter!.html).toContain("Grüße, “Odo”.");
    expect(await rowOf("a")).toMatchObject({ attempts: 1, lastError: null, doneAt: expect.any(Date) });
    expect(await sendDueMail(studio.db, post, studioUrl)).toBe(0);
  });

  it("queues a letter once for one cause, however often the cause is retried", async () => {
    await queue("a");
    await queue("a");
    await sendDueMail(studio.db, post, studioUrl);
    expect(await kept()).toHaveLength(1);
  });

  it("queues nothing when what would have caused the letter is undone", async () => {
    const undone = studio.db.transaction(async (tx) => {
      await queueMail(tx, "undone", { to: "odo@ringwright.example", subject: "No", paragraphs: ["No."] });
      throw new Error("undone");
    });
    await expect(undone).rejects.toThrow("undone");
    expect(await sendDueMail(studio.db, post, studioUrl)).toBe(0);
  });

  it("puts a letter off when the server is not there, says why, and sends it later under the same Message-ID", async () => {
    await queue("a");
    const dead = await deadPost();
    expect(await sendDueMail(studio.db, dead, studioUrl)).toBe(1);
    const failed = await rowOf("a");
    expect(failed).toMatchObject({
      attempts: 1,
      doneAt: null,
      lastError: expect.stringContaining("ECONNREFUSED"),
    });
    expect(failed.dueAt.getTime()).toBeGreaterThan(failed.createdAt.getTime() + 4000);
    expect(await sendDueMail(studio.db, post, studioUrl)).toBe(0);

    await studio.db.update(outbox).set({ dueAt: sql`now()` });
    expect(await sendDueMail(studio.db, post, studioUrl)).toBe(1);
    expect((await kept()).map(({ messageId }) => messageId)).toEqual([messageIdOf("mail a")]);
    expect(await rowOf("a")).toMatchObject({ attempts: 2, lastError: null, doneAt: expect.any(Date) });
    dead.close();
  });

  it("waits longer after each failure", async () => {
    await queue("a");
    const waits: number[] = [];
    for (let failures = 0; failures < 3; failures += 1) {
      await studio.db.update(outbox).set({ dueAt: sql`now()` });
      await sendDueMail(studio.db, null, studioUrl);
      const waiting = sql<string>`extract(epoch from due_at - clock_timestamp())`;
      const [row] = await studio.db.select({ waiting }).from(outbox);
      waits.push(Number(row!.waiting));
    }
    expect(waits[1]!).toBeGreaterThan(waits[0]!);
    expect(waits[2]!).toBeGreaterThan(waits[1]!);
    expect((await rowOf("a")).lastError).toBe("SMTP_URL is not set, so no mail can be sent.");
  });

  it("sends the others when one letter cannot be written", async () => {
    await studio.db.insert(outbox).values({ key: "mail broken", kind: "mail", payload: { to: 3 } });
    await queue("b");
    expect(await sendDueMail(studio.db, post, studioUrl)).toBe(2);
    expect((await kept()).map(({ subject }) => subject)).toEqual(["About b"]);
    expect((await rowOf("broken")).lastError).toContain("to");
  });

  it("sends again, known by its Message-ID, what was sent before a process died unmarked", async () => {
    await queue("a");
    const dying = openDatabase(studio.url, 1);
    dying.$client.on("error", () => undefined);
    const cut: Post = {
      close: () => undefined,
      async send(letter) {
        await post.send(letter);
        // The connection is lost after the server has the letter and before the row is marked.
        await studio.db.execute(
          sql`select pg_terminate_backend(pid) from pg_stat_activity where datname = current_database() and state = 'idle in transaction'`,
        );
      },
    };
    await expect(sendDueMail(dying, cut, studioUrl)).rejects.toThrow();
    await dying.$client.end();
    expect(await rowOf("a")).toMatchObject({ attempts: 0, doneAt: null });
    await sendDueMail(studio.db, post, studioUrl);
    const letters = await kept();
    expect(letters.map(({ messageId }) => messageId)).toEqual([messageIdOf("mail a"), messageIdOf("mail a")]);
    expect(letters[0]!.html).toBe(letters[1]!.html);
  });

  it("never sends one letter from two relays at once", async () => {
    for (let n = 0; n < 8; n += 1) await queue(`n${n}`);
    const taken = await Promise.all([1, 2, 3].map(() => sendDueMail(studio.db, post, studioUrl)));
    expect(taken.reduce((sum, n) => sum + n, 0)).toBe(8);
    expect(new Set((await kept()).map(({ messageId }) => messageId)).size).toBe(8);
    expect(await kept()).toHaveLength(8);
  });

  it("writes to one address and no other, whatever the address says", async () => {
    await queue("a", "odo@ringwright.example, eve@ringwright.example");
    await sendDueMail(studio.db, post, studioUrl);
    const recipients = (await kept()).flatMap(({ to }) => to);
    expect(recipients).not.toContain("eve@ringwright.example");
  });
});
