import { useId } from "react";
import { boxAlong, pointAt, type RulerFrame, strokeAcross } from "./frame";
import { type Placement, snapToHalf } from "./scale";

export interface SnapMark {
  value: number;
  /** What stands there: "innermost stable orbit". */
  label: string;
}

export interface Hatching {
  from: number;
  to: number;
  /** Why this ground is not for use, in a few words. */
  reason: string;
  /** No index may stand here, and the reason is written above. Handles are hatched without being forbidden. */
  forbidden?: boolean;
}

export interface Band {
  from: number;
  to: number;
  /** Any CSS colour: "var(--ice)". */
  fill: string;
}

export interface MarksProps {
  frame: RulerFrame;
  placement: Placement;
  snaps?: readonly SnapMark[] | undefined;
  hatched?: readonly Hatching[] | undefined;
  bands?: readonly Band[] | undefined;
  cut?: readonly [number, number] | undefined;
  keyed?: readonly number[] | undefined;
  /** The stretches above the line that values stand in. */
  values: readonly { at: number; width: number }[];
}

/** What stands above the line: bands, forbidden ground, snap marks, the cut's brackets and the keyed values. */
export function RulerMarks({ frame, placement, snaps, hatched, bands, cut, keyed, values }: MarksProps) {
  const at = (value: number) => snapToHalf(placement.at(value));
  return (
    <g>
      {bands?.map((band) => (
        <rect
          key={`${band.from}-${band.to}`}
          fill={band.fill}
          shapeRendering="crispEdges"
          {...boxAlong(frame, placement.at(band.from), placement.at(band.to), -7.5, -0.5)}
        />
      ))}
      {hatched?.map((ground) => (
        <Ground key={ground.from} {...{ frame, placement, ground, values }} />
      ))}
      {snaps?.map(({ value, label }) => (
        <line key={value} className="stroke-text" {...strokeAcross(frame, at(value), -11, 0)}>
          <title>{label}</title>
        </line>
      ))}
      {cut?.map((value) => (
        <line
          key={value}
          data-cut=""
          className="stroke-text"
          strokeWidth={2}
          {...strokeAcross(frame, Math.round(placement.at(value)), -10.5, 13)}
        />
      ))}
      {keyed?.map((value) => (
        <rect
          key={value}
          data-keyed=""
          className="fill-ember"
          {...boxAlong(frame, at(value) - 1.5, at(value) + 1.5, -9.5, -1.5)}
        />
      ))}
    </g>
  );
}

type GroundProps = Pick<MarksProps, "frame" | "placement" | "values"> & { ground: Hatching };

function Ground({ frame, placement, ground, values }: GroundProps) {
  const id = useId();
  const ends = [placement.at(ground.from), placement.at(ground.to)];
  const [start, end] = [Math.max(0, Math.min(...ends)), Math.min(placement.length, Math.max(...ends))];
  return (
    <g data-hatched="">
      <title>{ground.reason}</title>
      <pattern id={id} width={4} height={4} patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
        <line className="stroke-rule" strokeWidth={2} x1={0} y1={0} x2={0} y2={4} />
      </pattern>
      <rect fill={`url(#${id})`} {...boxAlong(frame, start, end, -7.5, -0.5)} />
      {ground.forbidden && !frame.vertical && (
        <Reason {...{ frame, placement, values, start, end }} words={ground.reason} />
      )}
    </g>
  );
}

type ReasonProps = Pick<MarksProps, "frame" | "placement" | "values"> & {
  start: number;
  end: number;
  words: string;
};

/** The reason above forbidden ground; it steps up a line where a value would run into it. */
function Reason({ frame, placement, values, start, end, words }: ReasonProps) {
  const width = words.length * 6;
  const atEnd = end > placement.length - 1 && start > 1;
  const [left, right] = atEnd ? [end - 4 - width, end - 4] : [start + 4, start + 4 + width];
  const met = values.some(
    (value) => value.at + value.width / 2 > left - 6 && value.at - value.width / 2 < right + 6,
  );
  return (
    <text
      className="type-small fill-soft"
      textAnchor={atEnd ? "end" : "start"}
      {...pointAt(frame, atEnd ? right : left, met ? -26 : -14)}
    >
      {words}
    </text>
  );
}
