import { cpSync, mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { runCommand } from "./processes.mjs";
import { stampOf } from "./stamps.mjs";

/**
 * Whether drizzle/ says all that db/schema says: generating into a copy must add nothing. Needs no database.
 * @param {string} root
 */
export async function checkMigrations(root) {
  const scratch = mkdtempSync(join(tmpdir(), "ringwright-migrations-"));
  try {
    cpSync(join(root, "drizzle"), scratch, { recursive: true });
    const before = stampOf(scratch, ["."]);
    const { code, output } = await runCommand({
      command: process.execPath,
      args: [
        "node_modules/drizzle-kit/bin.cjs",
        "generate",
        "--dialect",
        "postgresql",
        "--schema",
        "./db/schema",
        "--out",
        scratch,
      ],
      options: { cwd: root },
    });
    if (code !== 0) return { code, output };
    if (stampOf(scratch, ["."]) === before) return { code: 0, output: "" };
    const { entries } = JSON.parse(readFileSync(join(scratch, "meta", "_journal.json"), "utf8"));
    const added = readFileSync(join(scratch, `${entries.at(-1).tag}.sql`), "utf8");
    return {
      code: 1,
      output: `db/schema says what no migration does yet. Run npm run db:generate; it would add:\n${added}`,
    };
  } finally {
    rmSync(scratch, { recursive: true, force: true });
  }
}
