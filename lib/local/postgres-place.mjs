import { spawnSync } from "node:child_process";
import { createHash } from "node:crypto";
import { existsSync, mkdirSync, readFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { Refusal } from "./refusal.mjs";

/** @typedef {{ uid: number, gid: number }} Account */
/**
 * Where the cluster lives and how its programs are run there.
 * @typedef {{ folder: string, account: Account | null, wrap: (command: string, args: string[]) => import("./processes.mjs").Command, note?: string }} Place
 */

/**
 * PostgreSQL refuses to run as root, so root runs it as the user `postgres`. That user may be unable to pass a closed
 * folder above the data: then it is given the right to search folders, or the data is kept where it can go.
 * @param {string} folder an absolute path
 * @returns {Place}
 */
export function choosePlace(folder) {
  if (process.getuid?.() !== 0) return { folder, account: null, wrap: asOneself };
  const account = findPostgresAccount();
  const elsewhere = join(
    "/var/lib/ringwright",
    createHash("sha256").update(folder).digest("hex").slice(0, 16),
  );
  const asPostgres = wrapAsPostgres(account);
  const asSearcher = wrapAsSearcher(account);
  mkdirSync(dirname(folder), { recursive: true, mode: 0o711 });
  if (!existsSync(elsewhere)) {
    if (canPass(asPostgres, dirname(folder))) return { folder, account, wrap: asPostgres };
    if (canPass(asSearcher, dirname(folder))) return { folder, account, wrap: asSearcher };
  }
  mkdirSync(dirname(elsewhere), { recursive: true, mode: 0o755 });
  const note = `The user postgres cannot reach ${folder}, so the database is kept in ${elsewhere}.`;
  return { folder: elsewhere, account, wrap: asPostgres, note };
}

/** @type {Place["wrap"]} */
const asOneself = (command, args) => ({ command, args });

/** The working folder is / because the current one may be closed to that user. @param {Account} account @returns {Place["wrap"]} */
const wrapAsPostgres = (account) => (command, args) => ({ command, args, options: { ...account, cwd: "/" } });

/** @param {Account} account @returns {Place["wrap"]} */
const wrapAsSearcher = (account) => (command, args) => ({
  command: "setpriv",
  args: [
    `--reuid=${account.uid}`,
    `--regid=${account.gid}`,
    "--clear-groups",
    "--inh-caps=+dac_read_search",
    "--ambient-caps=+dac_read_search",
    "--",
    command,
    ...args,
  ],
  options: { cwd: "/" },
});

/**
 * Looks by stat at the folder's own dot: `test -x` would ask access(2), which knows nothing of granted rights.
 * @param {Place["wrap"]} wrap
 * @param {string} folder
 */
function canPass(wrap, folder) {
  const { command, args, options } = wrap("stat", [join(folder, ".")]);
  return spawnSync(command, args, { ...options, stdio: "ignore" }).status === 0;
}

/** @returns {Account} */
function findPostgresAccount() {
  const line = readFileSync("/etc/passwd", "utf8")
    .split("\n")
    .find((entry) => entry.startsWith("postgres:"));
  const [, , uid, gid] = (line ?? "").split(":");
  if (!uid || !gid) {
    throw new Refusal(
      "PostgreSQL refuses to run as root and there is no user named postgres: apt-get install postgresql",
    );
  }
  return { uid: Number(uid), gid: Number(gid) };
}
