import { sql } from "drizzle-orm";
import type { z } from "zod";
import type { Ctx } from "../context";
import { authorizeLog } from "./choose-log";
import type { exportLogInput } from "./schema";
import { sentenceOf } from "./sentence";

const law = [
  "# Ringwright event log.",
  "# One line an event, tab-separated: seq, at, actor, kind, subject, previous, hash, sentence.",
  "# hash = SHA-256, in hexadecimal, of the UTF-8 text: previous, chain, seq, at, actor, kind, subject, each on a line of its own,",
  "# with no line end after the last. Each line's previous is the hash of the line before it; the first line's is 64 zeros.",
];

interface ExportedRow extends Record<string, unknown> {
  seq: string;
  at: string;
  actor: string;
  kind: string;
  subject: string;
  previous: string;
  hash: string;
}

/** A whole log as plain text, with everything that was hashed, so that anyone can check the chain without us. */
export async function exportLog(
  ctx: Ctx,
  { production: chain }: z.infer<typeof exportLogInput>,
): Promise<string> {
  authorizeLog(ctx, chain);
  const { rows } = await ctx.db.execute<ExportedRow>(sql`
    select seq, to_char(at at time zone 'UTC', 'YYYY-MM-DD"T"HH24:MI:SS.US"Z"') as at, coalesce(actor_id::text, '-') as actor,
           kind, subject::text as subject, previous, hash
    from events where chain = ${chain} order by seq`);
  const lines = rows.map((row) => {
    const sentence = sentenceOf(row.kind, JSON.parse(row.subject) as Record<string, string | number>);
    const fields = [row.seq, row.at, row.actor, row.kind, row.subject, row.previous, row.hash, sentence];
    return fields.map(escape).join("\t");
  });
  return [...law, `# chain ${chain}`, ...lines].join("\n") + "\n";
}

// JSON text holds no raw tab or line end; a sentence, which quotes people, may.
const escape = (field: string) => field.replace(/[\t\r\n]+/g, " ");
