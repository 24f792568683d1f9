import { existsSync, readdirSync, readFileSync } from "node:fs";
import { delimiter, join } from "node:path";
import { Refusal } from "./refusal.mjs";

const DEBIAN_HOME = "/usr/lib/postgresql";
const OLDEST = 14;

/** PostgreSQL's program folders on this machine, newest version first (Debian's layout), then the PATH's. */
export function listProgramFolders() {
  const versions = existsSync(DEBIAN_HOME)
    ? readdirSync(DEBIAN_HOME).filter((name) => Number(name) >= OLDEST)
    : [];
  const debian = versions
    .sort((a, b) => Number(b) - Number(a))
    .map((version) => join(DEBIAN_HOME, version, "bin"));
  const onPath = (process.env.PATH ?? "").split(delimiter).filter(Boolean);
  return [...debian, ...onPath].filter((folder) =>
    ["postgres", "initdb", "psql"].every((program) => existsSync(join(folder, program))),
  );
}

/**
 * The program folder to use: the newest, or for an existing cluster the one of its own major version.
 * @param {string} clusterFolder
 */
export function choosePrograms(clusterFolder) {
  const folders = listProgramFolders();
  const versionFile = join(clusterFolder, "PG_VERSION");
  const wanted = existsSync(versionFile) ? readFileSync(versionFile, "utf8").trim() : null;
  const found = wanted ? folders.find((folder) => folder.startsWith(join(DEBIAN_HOME, wanted))) : undefined;
  const chosen = found ?? folders[0];
  if (!chosen) throw new Refusal("PostgreSQL is not installed: sudo apt-get install -y postgresql");
  if (wanted && !found && folders.some((folder) => folder.startsWith(DEBIAN_HOME))) {
    throw new Refusal(
      `The database in ${clusterFolder} was made by PostgreSQL ${wanted}, which is no longer installed. ` +
        `Install it (apt-get install postgresql-${wanted}), or start with another folder: npm start -- --data DIR.`,
    );
  }
  return chosen;
}
