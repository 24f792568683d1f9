import type { ShotLine } from "@/lib/shots/schema";
import { CheckBox } from "../field/check-box";
import { Standing } from "../standing/standing";
import { RowLink } from "../table/row-link";
import { Cell, FigureCell, Row } from "../table/table";
import { sayDuration } from "./say";
import { DueLane, sayHolder, ShotPicture, VersionLink, type Dates } from "./shot-facts";

export interface ShotRowProps {
  shot: ShotLine;
  dates: Dates;
  chosen: boolean;
  /** Absent for those who may not change shots. */
  onChoose?: ((chosen: boolean) => void) | undefined;
}

/** A shot's line in the table. Its box stands in the margin, and shows itself to the pointer, the keyboard and a finger. */
export function ShotRow({ shot, dates, chosen, onChoose }: ShotRowProps) {
  const faint = shot.standing === "omitted";
  const shown = chosen
    ? ""
    : "opacity-0 group-hover/shot:opacity-100 focus-within:opacity-100 pointer-coarse:opacity-100";
  return (
    <Row faint={faint} className={`group/shot h-51 ${chosen ? "bg-raised" : ""}`}>
      <Cell className="relative w-95 py-2">
        {onChoose && (
          <CheckBox
            label={`Choose ${shot.code}`}
            hideLabel
            checked={chosen}
            onChange={(event) => onChoose(event.target.checked)}
            className={`absolute top-1/2 -left-32 -translate-y-1/2 ${shown}`}
          />
        )}
        <ShotPicture shot={shot} width={83} height={45} />
      </Cell>
      <Cell className="px-8">
        <RowLink href={`/shots/${shot.id}/bench`} className="type-figure whitespace-nowrap">
          {shot.code}
        </RowLink>
      </Cell>
      <Cell className={`type-note ${faint ? "text-soft" : "text-text"}`}>{shot.brief}</Cell>
      <Cell>
        <Standing standing={shot.standing} />
      </Cell>
      <FigureCell>
        <VersionLink shot={shot} />
      </FigureCell>
      <Cell className={shot.holder.kind === "nobody" ? "text-soft" : "text-text"}>
        {sayHolder(shot.holder)}
      </Cell>
      <FigureCell className="hidden xl:table-cell">
        {shot.milliseconds > 0 ? sayDuration(shot.milliseconds) : "–"}
      </FigureCell>
      <Cell className="relative overflow-visible">
        <DueLane shot={shot} dates={dates} />
      </Cell>
    </Row>
  );
}
