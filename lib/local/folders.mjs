import { isAbsolute, join } from "node:path";

/** The repository's root. */
export const root = join(import.meta.dirname, "..", "..");

/**
 * Everything an installation keeps, by name. Nothing outside `data` is written but node_modules, .next and public/sky.
 * @param {string} dataDir absolute, or relative to the repository
 */
export function foldersIn(dataDir) {
  const data = isAbsolute(dataDir) ? dataDir : join(root, dataDir);
  return {
    data,
    postgres: join(data, "postgres"),
    storage: join(data, "storage"),
    mail: join(data, "mail"),
    logs: join(data, "logs"),
    secrets: join(data, "secrets.json"),
    ports: join(data, "ports.json"),
    pids: join(data, "pids.json"),
    lock: join(data, "launcher.lock"),
    accounts: join(data, "demo-accounts.json"),
  };
}

/** @typedef {ReturnType<typeof foldersIn>} Folders */
