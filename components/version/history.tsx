import type { VersionPage } from "@/lib/versions/schema";
import { momentOf } from "../studio/moments";

/** What happened to the version, oldest first, as the log has it. */
export function History({ version: { history, viewer } }: { version: VersionPage }) {
  return (
    <section aria-labelledby="history">
      <h2 id="history" className="type-label section-line font-medium text-text">
        History
      </h2>
      <ol>
        {history.map(({ at, sentence }) => (
          <li key={`${at} ${sentence}`} className="border-b border-hair py-8">
            <time dateTime={at} className="type-figure-small block text-soft">
              {momentOf(at, viewer.timeZone)}
            </time>
            <span className="type-label text-text">{sentence}</span>
          </li>
        ))}
      </ol>
    </section>
  );
}
