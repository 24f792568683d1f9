// The texts that go with the frames. The same delivery composes the same bytes: nothing here looks at a clock.
import { createHash } from "node:crypto";
import { composeReadme } from "./compose-readme";
import { composeScienceNote } from "./compose-science-note";
import { setName } from "./lay-out";
import type { Packed } from "./packed";
import type { PlannedItem } from "./plan-delivery";

export interface DeliveryDocument {
  path: string;
  body: string;
  sha256: string;
  bytes: number;
}

export const manifestPath = "manifest-sha256.txt";
export const scienceNotePath = "science/science-note.txt";

/** README, science note, each version's setup and, last, the manifest that covers everything but itself. */
export function composeDocuments(packed: Packed): DeliveryDocument[] {
  const texts = [
    document("README.txt", composeReadme(packed)),
    document(scienceNotePath, composeScienceNote(packed)),
    ...packed.items.flatMap(composeSetDocuments),
  ];
  const files = packed.items.flatMap((item) => item.files);
  return [...texts, document(manifestPath, composeManifest([...files, ...texts]))];
}

function composeSetDocuments(item: PlannedItem): DeliveryDocument[] {
  const folder = `science/${setName(item)}`;
  const setup = document(`${folder}/setup.json`, item.setup);
  return isWhole(item) ? [setup, document(`${folder}/version-manifest.txt`, item.manifest)] : [setup];
}

/**
 * Whether every file of the version is delivered. Only then does the list its digest was taken over go along: it names
 * every file of the version, and a client is told of none that was not delivered to them.
 */
export function isWhole(item: PlannedItem): boolean {
  const frames = item.versionLast - item.versionFirst + 1;
  return (
    item.first === item.versionFirst && item.last === item.versionLast && item.files.length === 2 * frames
  );
}

/** One line a file as `sha256sum` writes and checks it, in the order of the paths' bytes. */
export function composeManifest(files: readonly { path: string; sha256: string }[]): string {
  const lines = files.map(({ path, sha256 }) => ({ path, line: `${sha256}  ${path}\n` }));
  return lines
    .sort((a, b) => (a.path < b.path ? -1 : 1))
    .map(({ line }) => line)
    .join("");
}

function document(path: string, body: string): DeliveryDocument {
  const content = Buffer.from(body, "utf8");
  return { path, body, sha256: createHash("sha256").update(content).digest("hex"), bytes: content.length };
}
