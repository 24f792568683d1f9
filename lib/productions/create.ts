import type { z } from "zod";
import type { Transaction } from "@/db/client";
import { productions } from "@/db/schema/productions";
import { authorize } from "../auth/authorize";
import type { Ctx } from "../context";
import { DomainError } from "../errors";
import { recordEvent } from "../events/record";
import type { createProductionInput } from "./schema";

type NewProduction = z.infer<typeof createProductionInput>;

/** Begins a production. Its code begins its shots' codes and its files' names, so no two share one. */
export async function createProduction(ctx: Ctx, input: NewProduction): Promise<{ id: string }> {
  authorize(ctx.actor, "production.create", null);
  return ctx.db.transaction((tx) => addProduction(tx, ctx.actor, input));
}

/** As `createProduction`, within a transaction of someone whose authority is settled. */
export async function addProduction(
  tx: Transaction,
  by: { id: string; name: string },
  { code, name, kind }: NewProduction,
): Promise<{ id: string }> {
  const [made] = await tx
    .insert(productions)
    .values({ code, name, kind })
    .onConflictDoNothing({ target: productions.code })
    .returning({ id: productions.id });
  if (!made)
    throw new DomainError("conflict", `The code ${code} is another production's. Choose another.`, "code");
  await recordEvent(tx, {
    productionId: made.id,
    actorId: by.id,
    kind: "production.made",
    subject: { by: by.name, production: name, productionId: made.id },
  });
  return made;
}
