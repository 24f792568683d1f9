import type { QueueItem, ReviewQueue } from "@/lib/reviews/schema-pages";
import type { TodayItem } from "@/lib/today/schema";
import { Empty } from "../empty/empty";
import { LivePage } from "../live/live-page";
import { capitalised, countOf } from "../words/number-words";
import { sayMinutes } from "../today/headline";
import { WaitingList } from "../today/waiting-list";

/** The versions in review, oldest first: an advisor's queue, and for others what is with the advisors. */
export function ReviewPage({ queue }: { queue: ReviewQueue }) {
  const { items, today } = queue;
  return (
    <div className="mx-auto w-full max-w-1920 px-16 pt-24 pb-72 sm:px-48">
      <LivePage />
      <h1 className="type-title text-text max-sm:text-[1.875rem] max-sm:leading-38">{sayQueue(queue)}</h1>
      {items.length === 0 ? (
        <Empty title="Each version that was sent has its verdict." className="mt-24">
          A version comes here when an artist sends it for review, and leaves when all its frames are signed
          off, or some are returned.
        </Empty>
      ) : (
        <WaitingList items={items.map(rowOf)} today={today} />
      )}
    </div>
  );
}

function sayQueue({ items, judges }: ReviewQueue): string {
  if (items.length === 0) return "Nothing is in review.";
  const yours = items.filter((item) => item.yours);
  if (!judges || yours.length === 0)
    return `${capitalised(countOf(items.length, "version is", "versions are"))} in review.`;
  const minutes = sayMinutes(yours.reduce((sum, item) => sum + item.minutes, 0));
  return `${capitalised(countOf(yours.length, "version waits", "versions wait"))} for your verdict, about ${minutes}.`;
}

function rowOf(item: QueueItem): TodayItem {
  const frames = item.last - item.first + 1;
  const whose = item.yours ? "for your verdict" : "for a verdict";
  const facts = [
    ...(item.hold === "none" ? [] : [`The shot is ${item.hold}.`]),
    ...(item.withdrawn > 0 ? ["Its sign-off was withdrawn."] : []),
    ...(item.signed > 0 ? [`${item.signed} of its frames are signed off already.`] : []),
    `${item.maker}, ${item.production}: “${item.words}” ${frames} ${frames === 1 ? "frame" : "frames"} in ${item.quality} quality; ${item.minutes} minutes.`,
  ];
  return {
    about: item.id,
    sentence: {
      before: `Version ${item.number} of `,
      name: item.shotCode,
      after: ` has waited ${item.waited} ${whose}.`,
    },
    detail: facts.join(" "),
    act: item.yours
      ? { label: "Give the verdict", href: `/versions/${item.id}/verdict` }
      : { label: `Open version ${item.number}`, href: `/versions/${item.id}` },
    minutes: item.minutes,
    picture: {
      versionId: item.id,
      frame: Math.floor((item.first + item.last) / 2),
      square: item.kind === "dome",
    },
    sentOn: item.sentOn,
    dueOn: item.dueOn,
  };
}
