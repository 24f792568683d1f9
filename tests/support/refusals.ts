import { DomainError } from "@/lib/errors";

/** How a verb refuses: its code, or "nothing was refused". A fault is thrown on. */
export async function codeOf(work: Promise<unknown>): Promise<string> {
  return (await refusalOf(work)).code;
}

/** The refusal's code, words and field. */
export async function refusalOf(
  work: Promise<unknown>,
): Promise<{ code: string; message: string; field?: string }> {
  try {
    await work;
  } catch (error) {
    if (error instanceof DomainError) return { code: error.code, message: error.message, field: error.field };
    throw error;
  }
  return { code: "nothing was refused", message: "" };
}

/** The database's own words, without what the driver wraps around them. */
export async function databaseRefusal(work: Promise<unknown>): Promise<string> {
  return work.then(
    () => "nothing was refused",
    (error: Error) => String((error.cause as Error | undefined)?.message ?? error.message),
  );
}
