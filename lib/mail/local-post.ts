// A real mail server on loopback, for local use: it accepts every letter and keeps it as a file that Studio can show.
import { randomUUID } from "node:crypto";
import { mkdir, rename, writeFile } from "node:fs/promises";
import type { AddressInfo } from "node:net";
import { join } from "node:path";
import type { Readable } from "node:stream";
import { simpleParser } from "mailparser";
import { SMTPServer, type SMTPServerSession } from "smtp-server";
import { log } from "../log";
import type { LocalLetter } from "./local-letter";

const largestLetter = 10_000_000;

export interface LocalPost {
  port: number;
  close(): Promise<void>;
}

/** Listens on the port (0: any free one) and writes each letter into the folder, whole or not at all. */
export async function openLocalPost(port: number, folder: string): Promise<LocalPost> {
  await mkdir(folder, { recursive: true });
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ["AUTH", "STARTTLS"],
    size: largestLetter,
    logger: false,
    onData: (stream, session, done) => {
      keep(stream, session, folder).then(
        () => done(),
        (error: unknown) => {
          log.error({ err: error }, "a letter could not be kept");
          done(new Error("The letter could not be kept; the mail server's log says why."));
        },
      );
    },
  });
  // A client that hangs up is no reason to end.
  server.on("error", (error) => log.warn({ err: error }, "the local mail server met a fault"));
  await new Promise<void>((resolve, reject) => {
    server.server.once("error", reject);
    server.listen(port, "127.0.0.1", resolve);
  });
  return {
    port: (server.server.address() as AddressInfo).port,
    close: () => new Promise((resolve) => server.close(resolve)),
  };
}

async function keep(stream: Readable, session: SMTPServerSession, folder: string): Promise<void> {
  const mail = await simpleParser(stream);
  const receivedAt = new Date().toISOString();
  const id = `${receivedAt.replace(/[:.]/g, "-")}-${randomUUID().slice(0, 8)}`;
  const letter: LocalLetter = {
    id,
    receivedAt,
    messageId: mail.messageId ?? "",
    from: mail.from?.value.map(({ name, address }) => `${name} <${address}>`.trim()).join(", ") ?? "",
    to: session.envelope.rcptTo.map(({ address }) => address),
    subject: mail.subject ?? "",
    text: mail.text ?? "",
    html: mail.html || "",
  };
  const temporary = join(folder, `${id}.part`);
  await writeFile(temporary, JSON.stringify(letter, null, 2), { mode: 0o600 });
  await rename(temporary, join(folder, `${id}.json`));
}
