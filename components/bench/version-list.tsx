import Link from "next/link";
import type { BenchPage } from "@/lib/setups/schema";
import type { VersionLine } from "@/lib/versions/schema";
import { Standing } from "../standing/standing";
import { dayOf } from "../studio/moments";

/** The shot's versions, newest first, each with where it stands. */
export function VersionList({ page }: { page: BenchPage }) {
  return (
    <section aria-labelledby="versions" className="min-w-0">
      <h2 id="versions" className="type-label section-line font-medium text-text">
        Versions
      </h2>
      {page.versions.length === 0 ? (
        <p className="type-label py-12 text-soft">
          None yet. A version is a frozen copy of this setup with its frames; it is made at the foot of the
          page.
        </p>
      ) : (
        <ol className="max-h-360 overflow-y-auto">
          {page.versions.map((version) => (
            <li
              key={version.id}
              className="type-label flex flex-wrap items-baseline justify-between gap-x-16 border-b border-hair py-8"
            >
              <Link href={`/versions/${version.id}`} className="action">
                Version {version.number}
              </Link>
              <Standing standing={version.standing} />
              <span className="type-small w-full text-soft">{sayVersion(version, page.reader.timeZone)}</span>
            </li>
          ))}
        </ol>
      )}
    </section>
  );
}

function sayVersion({ quality, first, last, done, maker, madeAt }: VersionLine, timeZone: string): string {
  const of = last - first + 1;
  const frames = first === last ? `frame ${first}` : `frames ${first}–${last}`;
  const missing = done < of ? `, ${done} of ${of} rendered` : "";
  return `${quality}, ${frames}${missing}; ${maker}, ${dayOf(madeAt, timeZone)}`;
}
