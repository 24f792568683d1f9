import type { DoorFile } from "@/lib/deliveries/schema-pages";
import { readZip } from "./read-zip";

export interface Found {
  path: string;
  content: Blob;
}

export interface CheckResult {
  matching: string[];
  /** There, and other than it was signed. */
  different: string[];
  /** Not among what was chosen. */
  missing: string[];
  bytes: number;
}

/** What was chosen, as files with paths: an archive is read where it lies; a folder's files carry their own. */
export async function findChosen(files: readonly File[]): Promise<Found[]> {
  const found: Found[] = [];
  for (const file of files) {
    if (file.name.toLowerCase().endsWith(".zip")) found.push(...(await readZip(file)));
    else found.push({ path: file.webkitRelativePath || file.name, content: file });
  }
  return found;
}

/** Each delivered file with the chosen one of its path, whatever folders the package was put into. */
export function matchPaths(wanted: readonly DoorFile[], found: readonly Found[]): Map<string, Found> {
  const byPath = new Map(wanted.map((file) => [file.path, file]));
  const matched = new Map<string, Found>();
  for (const one of found) {
    const folders = one.path.split("/");
    const path = folders.map((_, from) => folders.slice(from).join("/")).find((tail) => byPath.has(tail));
    if (path !== undefined) matched.set(path, one);
  }
  return matched;
}

/**
 * Hashes what was chosen, piece by piece, and compares it with what was signed. `onBytes` is told how many bytes are done.
 * Rejects with the signal's reason when it is broken off.
 */
export async function checkFiles(
  wanted: readonly DoorFile[],
  found: readonly Found[],
  { onBytes, signal }: { onBytes: (bytes: number) => void; signal: AbortSignal },
): Promise<CheckResult> {
  const matched = matchPaths(wanted, found);
  const result: CheckResult = { matching: [], different: [], missing: [], bytes: 0 };
  // Brought only when something is checked: the page itself does without it.
  const hasher = await (await import("hash-wasm")).createSHA256();
  for (const { path, sha256, bytes } of wanted) {
    const content = matched.get(path)?.content;
    if (!content) {
      result.missing.push(path);
      continue;
    }
    const right = content.size === bytes && (await hash(content)) === sha256;
    (right ? result.matching : result.different).push(path);
  }
  return result;

  async function hash(content: Blob): Promise<string> {
    hasher.init();
    for (let start = 0; start < content.size; start += piece) {
      signal.throwIfAborted();
      const part = new Uint8Array(await content.slice(start, start + piece).arrayBuffer());
      hasher.update(part);
      result.bytes += part.length;
      onBytes(result.bytes);
    }
    return hasher.digest("hex");
  }
}

const piece = 4 << 20;

/** How many bytes of the chosen files will be hashed. */
export const bytesToCheck = (wanted: readonly DoorFile[], matched: ReadonlyMap<string, Found>): number =>
  wanted.reduce((sum, { path, bytes }) => sum + (matched.get(path)?.content.size === bytes ? bytes : 0), 0);

/** The result as a text that can be kept. */
export function writeReport(delivery: string, { matching, different, missing }: CheckResult): string {
  const list = (title: string, paths: string[]) =>
    paths.length > 0 ? [`${title}:`, ...paths.map((path) => `  ${path}`)] : [];
  return [
    `${delivery}: as signed ${matching.length}, not as signed ${different.length}, not among the chosen files ${missing.length}.`,
    ...list("Not as signed", different),
    ...list("Not among the chosen files", missing),
    ...list("As signed", matching),
    "",
  ].join("\n");
}
