import { execFileSync } from "node:child_process";
import { mkdtempSync, readdirSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";

/** Unpacks an archive with Debian's unzip into a new folder, and answers with the one folder in it. */
export function unpack(archive: string): string {
  const place = mkdtempSync(join(tmpdir(), "ringwright-delivery-"));
  execFileSync("unzip", ["-q", archive, "-d", place]);
  const inside = readdirSync(place);
  if (inside.length !== 1)
    throw new Error(`The archive holds ${inside.join(", ")}; one folder was expected.`);
  return join(place, inside[0]!);
}

/** The paths of every file below a folder, as the archive has them. */
export const filesIn = (folder: string): string[] =>
  readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath, entry.name).slice(folder.length + 1))
    .toSorted();

export const run = (program: string, args: string[], cwd: string): string =>
  execFileSync(program, args, { cwd, encoding: "utf8" });
