import { createHash } from "node:crypto";
import { render } from "@react-email/render";
import { tokenOf } from "../people/token";
import { Letter } from "./letter";
import type { MailPayload } from "./schema";

/** A letter ready to be sent. The same outbox row gives the same letter every time. */
export interface WrittenLetter {
  messageId: string;
  to: string;
  subject: string;
  text: string;
  html: string;
}

/** Writes out a queued letter. Its Message-ID follows from the row's key, so that a letter sent twice is known as one. */
export async function writeLetter(
  key: string,
  payload: MailPayload,
  studioUrl: string,
): Promise<WrittenLetter> {
  const { to, subject, paragraphs } = payload;
  const action = payload.action && { label: payload.action.label, url: addressOf(payload.action, studioUrl) };
  const html = await render(<Letter {...{ subject, paragraphs, studioUrl }} {...(action && { action })} />);
  return { messageId: messageIdOf(key), to, subject, html, text: writeText(paragraphs, action, studioUrl) };
}

export const messageIdOf = (key: string): string =>
  `<${createHash("sha256").update(key).digest("hex").slice(0, 40)}@ringwright.example>`;

function addressOf(action: NonNullable<MailPayload["action"]>, studioUrl: string): string {
  const path = action.link ? action.path + tokenOf(action.link) : action.path;
  return new URL(path, studioUrl).href;
}

function writeText(
  paragraphs: string[],
  action: { label: string; url: string } | undefined,
  studioUrl: string,
) {
  const act = action ? [`${action.label}:\n${action.url}`] : [];
  return [...paragraphs, ...act, `Sent by Ringwright at ${studioUrl}`].join("\n\n") + "\n";
}
