import type { Transaction } from "@/db/client";
import { DomainError } from "../errors";
import { findLatestVerdict } from "./find-verdicts";

/** Refuses a verdict by someone who had not seen the newest one: of two at once, the second is told of the first. */
export async function refuseSuperseded(
  tx: Transaction,
  versionId: string,
  after: string | null,
): Promise<void> {
  const latest = await findLatestVerdict(tx, versionId);
  if ((latest?.id ?? null) === after) return;
  throw new DomainError(
    "conflict",
    latest
      ? `${latest.by} gave the verdict “${latest.kind}” while this page was open. Load it again and read that first.`
      : "The verdict this page was opened with does not stand on this version. Load the page again.",
  );
}
