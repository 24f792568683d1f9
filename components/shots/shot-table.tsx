import type { ShotGroup, ShotList } from "@/lib/shots/schema";
import { DateRuler } from "../ruler/date-ruler";
import { HeadCell, Table } from "../table/table";
import { countOf } from "../words/number-words";
import { TodayLine, type Dates } from "./shot-facts";
import { ShotRow } from "./shot-row";

export interface ShotsShown {
  list: ShotList;
  dates: Dates;
  chosen: ReadonlySet<string>;
  onChoose?: ((id: string, chosen: boolean) => void) | undefined;
}

/** Columns before the machine time, which only wide screens have room for. */
const columns = 6;

/** The shots as a table whose rows end on one date ruler. */
export function ShotTable({ list, dates, chosen, onChoose }: ShotsShown) {
  return (
    <Table className="table-fixed">
      <caption className="sr-only">Shots of {list.production.name}</caption>
      <colgroup>
        <col className="w-95" />
        <col className="w-88" />
        <col />
        <col className="w-112" />
        <col className="w-60" />
        <col className="w-116 xl:w-132" />
        <col className="hidden w-100 xl:table-column" />
        <col className="w-[23%] xl:w-[29%]" />
      </colgroup>
      <thead>
        <tr>
          <HeadCell className="border-b-0">
            <span className="sr-only">picture</span>
          </HeadCell>
          <HeadCell className="border-b-0 px-8">shot</HeadCell>
          <HeadCell className="border-b-0">brief</HeadCell>
          <HeadCell className="border-b-0">standing</HeadCell>
          <HeadCell className="border-b-0 text-right">version</HeadCell>
          <HeadCell className="border-b-0">who has it</HeadCell>
          <HeadCell className="hidden border-b-0 text-right xl:table-cell">machine time</HeadCell>
          <HeadCell className="border-b-0 px-12 pb-0">
            <DateRuler {...dates} />
          </HeadCell>
        </tr>
      </thead>
      {list.groups.map((group) => (
        <Group key={group.id} group={group} {...{ dates, chosen, onChoose }} />
      ))}
    </Table>
  );
}

function Group({ group, dates, chosen, onChoose }: Omit<ShotsShown, "list"> & { group: ShotGroup }) {
  return (
    <tbody>
      {group.name && (
        <tr>
          <th
            scope="rowgroup"
            colSpan={columns}
            className="border-b border-text pt-16 pb-8 text-left font-normal"
          >
            <span className="type-heading text-[1.25rem]">{group.name}</span>
            <span className="type-label ml-16 text-soft">{sayGroup(group)}</span>
          </th>
          <td className="hidden border-b border-text xl:table-cell" />
          <td className="relative border-b border-text">
            <TodayLine {...dates} />
          </td>
        </tr>
      )}
      {group.shots.map((shot) => (
        <ShotRow
          key={shot.id}
          shot={shot}
          dates={dates}
          chosen={chosen.has(shot.id)}
          onChoose={onChoose && ((on) => onChoose(shot.id, on))}
        />
      ))}
    </tbody>
  );
}

/** "sequence 1, five shots", and how many of them are shown when a filter hides some. */
export function sayGroup({ number, shotCount, shots }: ShotGroup): string {
  const count = countOf(shotCount, "shot", "shots");
  const hidden = shots.length < shotCount ? `, ${shots.length === 0 ? "none" : shots.length} shown` : "";
  return `sequence ${number}, ${count}${hidden}`;
}
