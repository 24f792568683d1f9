import { createHash } from "node:crypto";
import { existsSync, lstatSync, readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";

/**
 * A hash over the names and contents of everything under the given paths; a missing path counts as empty.
 * Contents rather than dates, so that a checkout that changes nothing rebuilds nothing.
 * @param {string} root
 * @param {string[]} paths relative to root
 * @param {(path: string) => boolean} [keep]
 */
export function stampOf(root, paths, keep = () => true) {
  const hash = createHash("sha256");
  for (const path of listFiles(root, paths).filter(keep)) {
    hash.update(`${path}\0`).update(
      createHash("sha256")
        .update(readFileSync(join(root, path)))
        .digest(),
    );
  }
  return hash.digest("hex");
}

/**
 * @param {string} root
 * @param {string[]} paths
 * @returns {string[]} sorted, relative to root
 */
function listFiles(root, paths) {
  return paths
    .filter((path) => existsSync(join(root, path)))
    .flatMap((path) => {
      if (!lstatSync(join(root, path)).isDirectory()) return [path];
      const names = readdirSync(join(root, path)).map((name) => join(path, name));
      return listFiles(root, names);
    })
    .sort();
}
