// How a page reads: the actor or the sign-in page, then one verb; what is not theirs is not found.
import { randomUUID } from "node:crypto";
import { headers } from "next/headers";
import { notFound, redirect } from "next/navigation";
import { currentActor } from "@/lib/auth/session";
import type { Actor, Ctx } from "@/lib/context";
import { database } from "@/lib/database";
import { DomainError } from "@/lib/errors";

/** The signed-in actor, or the way to the sign-in page and back. */
export async function requireActor(): Promise<Actor> {
  const actor = await currentActor();
  if (actor) return actor;
  const here = (await headers()).get("x-path") ?? "/today";
  redirect(`/sign-in?next=${encodeURIComponent(here)}`);
}

/** Runs a reading verb for a page. */
export async function load<I, T>(verb: (ctx: Ctx, input: I) => Promise<T>, input: I): Promise<T> {
  const actor = await requireActor();
  try {
    return await verb({ db: database(), actor, requestId: randomUUID() }, input);
  } catch (error) {
    if (error instanceof DomainError && (error.code === "not-found" || error.code === "forbidden"))
      notFound();
    throw error;
  }
}
