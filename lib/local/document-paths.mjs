import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";

/** Made by running, so absent from a fresh clone. */
const GENERATED = /^(\.data|\.next|node_modules|public\/sky)(\/|$)/;
const PATH = /^[\w.()[\]@-]+(\/[\w.()[\]-]+)+\/?$/;

/**
 * Every path a document names: words with a slash inside code spans, and the targets of relative links.
 * @param {string} text markdown
 */
export function findPaths(text) {
  const prose = text.replace(/^```.*?^```/gms, "");
  const spans = [...prose.matchAll(/`([^`\n]+)`/g)].flatMap((match) => (match[1] ?? "").split(/\s+/));
  const links = [...prose.matchAll(/\]\(([^)#\s]+)[^)]*\)/g)].map((match) => match[1] ?? "");
  const named = spans.filter((word) => PATH.test(word) && !word.startsWith("@"));
  const targets = links.filter((target) => !/^[a-z]+:/.test(target));
  return [...new Set([...named, ...targets])].filter((path) => !GENERATED.test(path));
}

/**
 * @param {string} root
 * @param {string[]} documents
 * @returns {string[]} one sentence for each document or path that is not there
 */
export function findBrokenPaths(root, documents) {
  return documents.flatMap((name) => {
    if (!existsSync(join(root, name))) return [`${name} is missing.`];
    return findPaths(readFileSync(join(root, name), "utf8"))
      .filter((path) => !existsSync(join(root, path)))
      .map((path) => `${name} names ${path}, which does not exist.`);
  });
}
