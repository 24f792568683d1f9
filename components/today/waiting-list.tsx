import type { TodayItem } from "@/lib/today/schema";
import { DateRuler } from "../ruler/date-ruler";
import { chooseDates } from "../shots/date-range";
import { WaitingRow, waitingColumns } from "./waiting-row";

/** What waits, row by row, under one ruler of dates. */
export function WaitingList({ items, today }: { items: TodayItem[]; today: string }) {
  const dates = { ...chooseDates(items, today), today };
  return (
    <>
      <div className={`mt-36 items-end ${waitingColumns}`}>
        <div className="col-span-2 border-b border-text lg:mr-24 lg:mb-1" />
        <div className="hidden lg:block">
          <DateRuler {...dates} todayWord="today" />
        </div>
      </div>
      <ol>
        {items.map((item, index) => (
          <WaitingRow
            key={`${item.about} ${item.act.href}`}
            item={item}
            dates={dates}
            primary={index === 0}
          />
        ))}
      </ol>
    </>
  );
}
