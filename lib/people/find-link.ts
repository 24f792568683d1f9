import { and, eq, gt, isNull } from "drizzle-orm";
import type { Database, Transaction } from "@/db/client";
import type { LinkPurpose } from "@/db/enums";
import { links, people } from "@/db/schema/people";
import { DomainError } from "../errors";
import { hashToken } from "./token";

export type Link = typeof links.$inferSelect;

/** The link of this token, if it still opens; otherwise "gone", saying why and what to do. */
export async function findLink(
  db: Database | Transaction,
  purpose: LinkPurpose,
  token: string,
): Promise<Link> {
  const [row] = await db
    .select({ link: links, by: people.name })
    .from(links)
    .leftJoin(people, eq(people.id, links.createdBy))
    .where(and(eq(links.tokenHash, hashToken(token)), eq(links.purpose, purpose)));
  if (!row)
    throw new DomainError(
      "gone",
      "This is not one of our links. A part of it may be lost: copy the whole link from the letter.",
    );
  const why = whyShut(row.link, row.by ?? "the studio");
  if (why) throw new DomainError("gone", why);
  return row.link;
}

/** Uses the link up. Of two who use it at once, one does and the other is told. */
export async function useLink(tx: Transaction, link: Link): Promise<void> {
  const used = await tx
    .update(links)
    .set({ usedAt: new Date() })
    .where(
      and(
        eq(links.id, link.id),
        isNull(links.usedAt),
        isNull(links.revokedAt),
        gt(links.expiresAt, new Date()),
      ),
    )
    .returning({ id: links.id });
  if (used.length === 0)
    throw new DomainError(
      "conflict",
      `${noun(link)} was used or taken back this moment. Open it again to see which.`,
    );
}

function whyShut(link: Link, by: string): string | null {
  const again =
    link.purpose === "invitation" ? `Ask ${by} for a new one.` : "Ask for a new one on the sign-in page.";
  if (link.usedAt)
    return link.purpose === "invitation"
      ? "This invitation has been used. If it was you, sign in; if not, tell the studio."
      : `This link has been used. ${again}`;
  if (link.revokedAt)
    return link.purpose === "invitation"
      ? `This invitation was taken back. ${again}`
      : `A newer link took this one's place. Use the newest letter, or ask again on the sign-in page.`;
  if (link.expiresAt <= new Date()) return `${noun(link)} ended on ${dayOf(link.expiresAt)}. ${again}`;
  return null;
}

const noun = (link: Link) => (link.purpose === "invitation" ? "This invitation" : "This link");

const dayOf = (date: Date) =>
  date.toLocaleString("en-GB", {
    day: "numeric",
    month: "long",
    year: "numeric",
    hour: "2-digit",
    minute: "2-digit",
    timeZone: "UTC",
  }) + " UTC";
