import { and, eq, isNull } from "drizzle-orm";
import type { z } from "zod";
import { links, people } from "@/db/schema/people";
import { countTry } from "../auth/limits";
import { DomainError } from "../errors";
import { queueMail } from "../queue/outbox";
import type { Open } from "./accept-invitation";
import { revokeLinks } from "./revoke-links";
import type { askForResetInput } from "./schema";
import { newLink } from "./token";

const oneHour = 60 * 60 * 1000;

/** Sends a reset link if the address has an account. The answer is the same either way, so it tells nobody who is here. */
export async function askForReset(
  open: Open,
  { email }: z.infer<typeof askForResetInput>,
): Promise<{ words: string }> {
  await countTry(open.db, "reset asked by machine", open.from);
  if (!(await askedTooOften(open, email))) await sendLink(open, email);
  return {
    words: `If ${email} has an account, a letter with a link is on its way. The link works for one hour.`,
  };
}

// Past its limit an address gets no further letters, and the asker the same words as ever.
async function askedTooOften(open: Open, email: string): Promise<boolean> {
  try {
    await countTry(open.db, "reset asked by address", email);
    return false;
  } catch (error) {
    if (error instanceof DomainError) return true;
    throw error;
  }
}

async function sendLink(open: Open, email: string): Promise<void> {
  await open.db.transaction(async (tx) => {
    const [person] = await tx
      .select({ id: people.id, name: people.name })
      .from(people)
      .where(and(eq(people.email, email), isNull(people.leftAt)));
    if (!person) return;
    await revokeLinks(tx, { purpose: "password reset", email });
    const link = newLink();
    const expiresAt = new Date(Date.now() + oneHour);
    await tx
      .insert(links)
      .values({ ...link, purpose: "password reset", email, personId: person.id, expiresAt });
    await queueMail(tx, `password reset ${link.id}`, {
      to: email,
      subject: "A new password for Ringwright",
      paragraphs: [
        `${person.name}, someone asked for a new password for your account. If it was you, the link below lets you set one. It works once, and for one hour.`,
        "If it was not you, do nothing: your password stays as it is.",
      ],
      action: { label: "Set a new password", path: "/reset/", link: link.id },
    });
  });
}
