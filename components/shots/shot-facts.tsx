import Link from "next/link";
import type { Holder, ShotLine } from "@/lib/shots/schema";
import { DateLane } from "../ruler/date-lane";
import { Thumbnail } from "../figure/thumbnail";
import { thumbnailPath } from "../version/frame-path";

/** Who has the shot, in a word or a name. */
export const sayHolder = (holder: Holder): string =>
  holder.kind === "person" ? holder.name : holder.kind === "queue" ? "render queue" : "nobody";

export const isMet = ({ standing }: ShotLine): boolean => standing === "delivered" || standing === "received";

export function ShotPicture({ shot, width, height }: { shot: ShotLine; width: number; height: number }) {
  const { picture } = shot;
  const src = picture && thumbnailPath(picture.versionId, picture.frame, width > 168 ? 336 : 168);
  return <Thumbnail src={src} alt="" width={width} height={height} />;
}

export function VersionLink({ shot }: { shot: ShotLine }) {
  if (!shot.version) return <span aria-label="no version">–</span>;
  return (
    <Link
      href={`/versions/${shot.version.id}`}
      aria-label={`version ${shot.version.number} of ${shot.code}`}
      className="hover:text-bright hover:underline"
    >
      {shot.version.number}
    </Link>
  );
}

export interface Dates {
  from: string;
  to: string;
  today: string;
}

// Where the date ruler stands in its column: its lanes stand beneath it.
const lanePlace = "absolute inset-y-0 left-12 right-0";

/** The row's share of the date ruler. A shot that is held is not late, and one that is omitted has no date to keep. */
export function DueLane({ shot, dates }: { shot: ShotLine; dates: Dates }) {
  const { standing, dueOn } = shot;
  const past = dueOn !== null && dueOn < dates.today;
  const due = standing === "omitted" || (standing === "on hold" && past) ? null : dueOn;
  return (
    <div className={lanePlace}>
      <DateLane {...dates} due={due} met={isMet(shot)} />
    </div>
  );
}

/** Today's dotted line where a sequence's heading parts the lanes. */
export function TodayLine({ from, to, today }: Dates) {
  const share = (Date.parse(today) - Date.parse(from)) / (Date.parse(to) - Date.parse(from));
  return (
    <div className={lanePlace}>
      <div
        className="absolute inset-y-0 border-l border-dotted border-text"
        style={{ left: `${(100 * share).toFixed(3)}%` }}
      />
    </div>
  );
}
