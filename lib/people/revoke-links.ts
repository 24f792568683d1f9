import { and, eq, isNull, type SQL } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import type { LinkPurpose } from "@/db/enums";
import { links } from "@/db/schema/people";

export interface Which {
  purpose: LinkPurpose;
  email: string;
  productionId?: string;
}

/** Shuts every link of the kind that an e-mail address still holds. */
export async function revokeLinks(tx: Transaction, which: Which): Promise<void> {
  const conditions: SQL[] = [
    eq(links.purpose, which.purpose),
    eq(links.email, which.email),
    isNull(links.usedAt),
    isNull(links.revokedAt),
  ];
  if (which.productionId) conditions.push(eq(links.productionId, which.productionId));
  await tx
    .update(links)
    .set({ revokedAt: new Date() })
    .where(and(...conditions));
}
