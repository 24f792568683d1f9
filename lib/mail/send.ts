import nodemailer from "nodemailer";
import type { WrittenLetter } from "./write-letter";

export interface Post {
  send(letter: WrittenLetter): Promise<void>;
  close(): void;
}

/** Opens the way to a mail server. Waits are bounded, so that a silent server holds nothing up for long. */
export function openPost(smtpUrl: string, from: string): Post {
  const transport = nodemailer.createTransport({
    url: smtpUrl,
    connectionTimeout: 10_000,
    greetingTimeout: 10_000,
    socketTimeout: 20_000,
    // A letter is text that we wrote: it attaches nothing from a disk or another host.
    disableFileAccess: true,
    disableUrlAccess: true,
  });
  return {
    async send({ messageId, to, subject, text, html }) {
      await transport.sendMail({
        from,
        // As an object, so that nothing in an address can name a second recipient.
        to: { name: "", address: to },
        subject,
        text,
        html,
        messageId,
        headers: { "Auto-Submitted": "auto-generated" },
      });
    },
    close: () => transport.close(),
  };
}
