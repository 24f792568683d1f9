import type { TodayItem } from "@/lib/today/schema";
import { LinkButton } from "../button/link-button";
import { Thumbnail } from "../figure/thumbnail";
import { DateLane } from "../ruler/date-lane";
import { dayOf, sayDay } from "../ruler/dates";
import { thumbnailPath } from "../version/frame-path";
import type { Dates } from "../shots/shot-facts";

export interface WaitingRowProps {
  item: TodayItem;
  dates: Dates;
  /** The first row's act is the page's own. */
  primary?: boolean;
}

/** The columns that the head of the list and its rows share, so that each lane lies under the date ruler. */
export const waitingColumns =
  "lg:grid lg:grid-cols-[188px_minmax(0,1fr)_300px] lg:gap-x-28 xl:grid-cols-[188px_minmax(0,1fr)_424px]";

/** One thing that waits: what it is, in a sentence; what is to know; the one act; and its place among the days. */
export function WaitingRow({ item, dates, primary }: WaitingRowProps) {
  const { sentence, detail, act } = item;
  return (
    <li
      className={`relative flex flex-wrap gap-x-16 gap-y-12 border-b border-hair py-14 lg:min-h-132 ${waitingColumns}`}
    >
      <Picture picture={item.picture} />
      <div className="min-w-0 flex-1 basis-224 lg:basis-auto">
        <h2 className="type-heading text-text max-sm:text-[1.3125rem] max-sm:leading-27">
          {sentence.before}
          <strong className="font-semibold">{sentence.name}</strong>
          {sentence.after}
        </h2>
        <p className="type-label mt-4 max-w-640 text-soft">{detail}</p>
        <div className="mt-12 flex flex-wrap items-center gap-16">
          <LinkButton href={act.href} look={primary ? "primary" : "plain"}>
            {act.label}
          </LinkButton>
          {item.dueOn && (
            <span className="type-figure-small text-soft lg:hidden">{sayDue(item.dueOn, dates.today)}</span>
          )}
        </div>
      </div>
      <div className="relative hidden lg:block">
        <DateLane {...dates} due={item.dueOn} duePrefix="due" sent={item.sentOn} className="-my-14" />
      </div>
    </li>
  );
}

const sayDue = (due: string, today: string) => `${due < today ? "was due" : "due"} ${sayDay(dayOf(due))}`;

function Picture({ picture }: Pick<TodayItem, "picture">) {
  const size = picture?.square ? { width: 104, height: 104 } : { width: 188, height: 104 };
  return (
    <div className={picture ? "" : "hidden lg:block"}>
      {picture && <Thumbnail src={thumbnailPath(picture.versionId, picture.frame, 336)} alt="" {...size} />}
    </div>
  );
}
