// The declaration's sentences. The screen lays out the same words that the database keeps as the statement.
import type { ChosenKind } from "./schema";

export interface Declaration {
  advisor: string;
  production: string;
  shotCode: string;
  number: number;
  maker: string;
  first: number;
  last: number;
  digest: string;
  kind: ChosenKind;
  words: string;
}

/** What each choice means, after its word. */
export const meanings: Record<ChosenKind, string> = {
  "signed off": "They may be delivered with the science note as it stands.",
  returned: "They may not; the reason follows.",
};

export const frameWords = (first: number, last: number): string =>
  first === last ? `frame ${first}` : `frames ${first} to ${last}`;

export function composeDeclaration(said: Declaration): string {
  const frames = frameWords(said.first, said.last);
  const sentences = [
    `I, ${said.advisor}, science advisor to ${said.production}, have looked at ${frames} of version ${said.number} ` +
      `of ${said.shotCode}, made by ${said.maker}, and at no other bytes than those of the digest ${said.digest}.`,
    `On these frames I declare: ${said.kind}. ${meanings[said.kind]}`,
  ];
  if (said.words) sentences.push(`In these words: “${said.words}”`);
  return sentences.join("\n\n");
}

export function composeWithdrawal(said: Omit<Declaration, "kind" | "maker">): string {
  const frames = frameWords(said.first, said.last);
  return [
    `I, ${said.advisor}, science advisor to ${said.production}, withdraw the sign-off of ${frames} of ` +
      `version ${said.number} of ${said.shotCode}, of the digest ${said.digest}. They may no longer be delivered or taken.`,
    `For this reason: “${said.words}”`,
  ].join("\n\n");
}
