import Link from "next/link";
import type { VersionPage } from "@/lib/versions/schema";
import { Digest } from "../figure/digest";
import { ReviewActions } from "../review/review-actions";
import { Standing } from "../standing/standing";
import { dayOf } from "../studio/moments";

/** Which version this is, how it stands, under which digest, and what the reader can do about it. */
export function VersionHead({ version }: { version: VersionPage }) {
  const { shot, number, standing, newer, seal, viewer, maker } = version;
  const reviewed = {
    id: version.id,
    number,
    shotCode: shot.code,
    digest: seal?.digest ?? null,
    standing,
    madeById: maker.id,
  };
  return (
    <header className="flex flex-wrap items-center gap-x-36 gap-y-8 py-8">
      <h1 className="flex items-baseline gap-12">
        <Link href={`/shots/${shot.id}/bench`} className="type-code text-text hover:text-bright">
          {shot.code}
        </Link>{" "}
        <span className="type-figure text-soft">version {number}</span>
      </h1>
      <p className="type-label flex flex-wrap items-center gap-x-8 gap-y-4 text-soft">
        <Standing standing={standing} />
        <span>{sayWho(version)}</span>
        {newer && (
          <Link href={`/versions/${newer.id}`} className="action">
            Version {newer.number} is newer
          </Link>
        )}
      </p>
      {seal && (
        <p className="type-label text-soft">
          digest <Digest digest={seal.digest} short />
        </p>
      )}
      <div className="flex flex-1 flex-wrap items-center justify-end gap-16">
        <nav aria-label="Parts of this page" className="type-label flex gap-16">
          <a href="#files" className="action">
            Files
          </a>
          <a href="#history" className="action">
            History
          </a>
        </nav>
        <ReviewActions
          version={reviewed}
          viewer={{
            ...viewer,
            maySend: viewer.maySend && newer === null,
            mayGiveVerdict: viewer.mayGiveVerdict && newer === null,
          }}
        />
      </div>
    </header>
  );
}

function sayWho({ standing, sent, maker, madeAt, viewer }: VersionPage): string {
  if (standing === "in review" && sent) return `sent by ${sent.by} on ${dayOf(sent.at, viewer.timeZone)}`;
  return `made by ${maker.name} on ${dayOf(madeAt, viewer.timeZone)}`;
}
