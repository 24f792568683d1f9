import type { Transaction } from "@/db/client";
import type { VerdictKind } from "@/db/enums";
import type { Actor } from "../context";
import { queueMail } from "../queue/outbox";
import { findConcerned } from "./find-members";
import type { FoundVersion } from "./find-version";
import { frameWords } from "./schema-declaration";

export interface GivenVerdict {
  id: string;
  kind: VerdictKind;
  first: number;
  last: number;
  words: string;
}

const acts: Record<VerdictKind, string> = {
  "signed off": "signed off",
  returned: "returned",
  withdrawn: "withdrew the sign-off of",
};

/** Tells the maker, the sender and the producers. */
export async function tellVerdict(
  tx: Transaction,
  actor: Actor,
  version: FoundVersion,
  verdict: GivenVerdict,
): Promise<void> {
  const name = `version ${version.number} of ${version.shotCode}`;
  const happened = `${actor.name} ${acts[verdict.kind]} ${name}, ${frameWords(verdict.first, verdict.last)}.`;
  for (const person of await findConcerned(tx, version, actor.id))
    await queueMail(tx, `verdict ${verdict.id} ${person.id}`, {
      to: person.email,
      subject:
        verdict.kind === "withdrawn"
          ? `The sign-off of ${name} is withdrawn`
          : `You can read the verdict on ${name}: ${verdict.kind}`,
      paragraphs: [
        happened,
        ...(verdict.words ? [`“${verdict.words}”`] : []),
        `Its digest is ${version.digest}.`,
      ],
      action: { label: `Open version ${version.number}`, path: `/versions/${version.id}` },
    });
}
