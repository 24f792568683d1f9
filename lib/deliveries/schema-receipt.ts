// The receipt's sentences: the screen shows the words that are kept.
import type { ReceiptKind } from "@/db/enums";

export interface Receipt {
  client: string;
  number: number;
  title: string;
  files: number;
  kind: ReceiptKind;
  words: string;
  manifestDigest: string;
}

export function composeReceipt(said: Receipt): string {
  const delivery = `delivery ${said.number}, ${said.title}`;
  const digest = `under the manifest digest ${said.manifestDigest}`;
  const files = `${said.files.toLocaleString("en")} ${said.files === 1 ? "file" : "files"}`;
  const statement =
    said.kind === "received"
      ? `I, ${said.client}, have received ${files} of ${delivery}, each as it was signed, ${digest}.`
      : `I, ${said.client}, refuse ${delivery}, ${digest}.`;
  if (!said.words) return statement;
  return `${statement}\n\n${said.kind === "received" ? "In these words" : "For this reason"}: “${said.words}”`;
}
