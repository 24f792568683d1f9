import type { Today } from "@/lib/today/schema";
import { TextLink } from "../button/text-action";
import { LivePage } from "../live/live-page";
import { sayHeadline } from "./headline";
import { WaitingList } from "./waiting-list";

/** What waits for the reader, as sentences on one ruler of dates, and what happened lately beneath. */
export function TodayPage({ page }: { page: Today }) {
  const { items, events, seesLog } = page;
  return (
    <div className="mx-auto w-full max-w-1920 px-16 pt-24 pb-72 sm:px-48">
      <LivePage />
      <p className="type-figure text-soft">{page.now} in your time zone</p>
      <h1 className="type-title mt-4 text-text max-sm:text-[1.875rem] max-sm:leading-38">
        {sayHeadline(items)}
      </h1>
      {items.length === 0 ? (
        <p className="type-body mt-12 max-w-560 text-soft">
          {seesLog
            ? "What asks for your work or your word will stand here, the most pressing first."
            : "Deliveries that are published to you will stand here until you have signed for them."}
        </p>
      ) : (
        <>
          <WaitingList items={items} today={page.today} />
          <p className="type-label mt-16 text-soft">
            {footing(items.some(({ minutes }) => minutes !== null))}
          </p>
        </>
      )}
      {seesLog && <Happened events={events} />}
    </div>
  );
}

const footing = (reckoned: boolean) =>
  reckoned
    ? "Nothing else waits. Minutes are reckoned: ten for a version's figures and words and four seconds a frame; other words at 200 a minute."
    : "Nothing else waits.";

function Happened({ events }: Pick<Today, "events">) {
  const half = Math.ceil(events.length / 2);
  return (
    <section aria-labelledby="happened" className="mt-48">
      <div className="flex items-baseline justify-between gap-16 border-b border-text pb-8">
        <h2 id="happened" className="type-body font-medium text-text">
          What happened lately
        </h2>
        <TextLink href="/studio/log" className="type-label">
          The whole log
        </TextLink>
      </div>
      <div className="grid gap-x-48 lg:grid-cols-2">
        {[events.slice(0, half), events.slice(half)].map((lines, column) => (
          <ol key={column} className="min-w-0">
            {lines.map(({ id, when, sentence }) => (
              <li key={id} className="grid grid-cols-[60px_minmax(0,1fr)] gap-12 border-b border-hair py-8">
                <span className="type-figure-small leading-18 text-soft">{when}</span>
                <span className="type-label break-words text-text">{sentence}</span>
              </li>
            ))}
          </ol>
        ))}
      </div>
    </section>
  );
}
