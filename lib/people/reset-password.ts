import { and, eq, isNull, sql } from "drizzle-orm";
import type { z } from "zod";
import type { Database } from "@/db/client";
import { people } from "@/db/schema/people";
import { countTry } from "../auth/limits";
import { hashPassword } from "../auth/password";
import { found } from "../errors";
import { recordEvent } from "../events/record";
import { queueMail } from "../queue/outbox";
import type { Open } from "./accept-invitation";
import { findLink, useLink } from "./find-link";
import { revokeLinks } from "./revoke-links";
import type { linkInput, resetPasswordInput } from "./schema";

/** Whose password a reset link sets; "gone" when it no longer does. */
export async function openReset({ db }: { db: Database }, { token }: z.infer<typeof linkInput>) {
  const { email } = await findLink(db, "password reset", token);
  return { email };
}

/** Sets a new password by an e-mailed link, and ends every session that began under the old one. */
export async function resetPassword(
  open: Open,
  { token, password }: z.infer<typeof resetPasswordInput>,
): Promise<{ email: string }> {
  await countTry(open.db, "link tried by machine", open.from);
  const link = await findLink(open.db, "password reset", token);
  const passwordHash = await hashPassword(password);
  await open.db.transaction(async (tx) => {
    await useLink(tx, link);
    await revokeLinks(tx, { purpose: "password reset", email: link.email });
    const [row] = await tx
      .update(people)
      .set({ passwordHash, sessionEpoch: sql`${people.sessionEpoch} + 1` })
      .where(and(eq(people.id, link.personId!), isNull(people.leftAt)))
      .returning({ id: people.id, name: people.name });
    const person = found(row, "account");
    await recordEvent(tx, {
      productionId: null,
      actorId: person.id,
      kind: "password.changed",
      subject: { by: person.name, personId: person.id },
    });
    await queueMail(tx, `password changed ${link.id}`, {
      to: link.email,
      subject: "Your password was changed",
      paragraphs: [
        `${person.name}, the password of your account was changed by a link sent to this address, and every session under the old one has ended.`,
        "If it was not you, tell the studio's owner now.",
      ],
    });
  });
  return { email: link.email };
}
