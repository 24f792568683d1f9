import { randomBytes } from "node:crypto";
import { linkSync, mkdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { dirname } from "node:path";

/** @typedef {{ databaseAdminPassword: string, databasePassword: string, nextauthSecret: string }} Secrets */

/**
 * The secrets of this installation, made once and readable by its owner alone.
 * @param {string} file
 * @returns {Secrets}
 */
export function ensureSecrets(file) {
  mkdirSync(dirname(file), { recursive: true, mode: 0o711 });
  return readSecrets(file) ?? makeSecrets(file);
}

/** @param {string} file @returns {Secrets | null} */
function readSecrets(file) {
  try {
    return JSON.parse(readFileSync(file, "utf8"));
  } catch (error) {
    if (error instanceof Error && "code" in error && error.code === "ENOENT") return null;
    throw error;
  }
}

/**
 * Written whole under another name and then linked: of two starts at once, one makes them and both read the same.
 * @param {string} file
 */
function makeSecrets(file) {
  const secret = () => randomBytes(24).toString("base64url");
  const made = { databaseAdminPassword: secret(), databasePassword: secret(), nextauthSecret: secret() };
  const half = `${file}.${process.pid}`;
  writeFileSync(half, `${JSON.stringify(made, null, 2)}\n`, { mode: 0o600 });
  try {
    linkSync(half, file);
  } catch {
    // Another start was first.
  }
  rmSync(half);
  return /** @type {Secrets} */ (readSecrets(file));
}
