import { pointAt, type RulerFrame, strokeAcross } from "./frame";
import type { Tick } from "./ticks";

export interface RulerLineProps {
  frame: RulerFrame;
  length: number;
  ticks: Tick[];
  disabled?: boolean | undefined;
}

/** The hairline, its ticks and their figures. */
export function RulerLine({ frame, length, ticks, disabled }: RulerLineProps) {
  const start = pointAt(frame, 0, 0);
  const end = pointAt(frame, length, 0);
  if (disabled)
    return (
      <line className="stroke-rule" strokeDasharray="3 2" x1={start.x} y1={start.y} x2={end.x} y2={end.y} />
    );
  return (
    <g>
      <line className="stroke-text" x1={start.x} y1={start.y} x2={end.x} y2={end.y} />
      {ticks.map((tick) => (
        <g key={tick.value}>
          <line
            className={tick.length === 13 ? "stroke-text" : "stroke-soft"}
            {...strokeAcross(frame, tick.at, frame.hang * 0.5, frame.hang * tick.length)}
          />
          {tick.label !== undefined && (
            <text
              className="type-ruler fill-soft"
              textAnchor={frame.vertical ? "end" : "middle"}
              dy={frame.vertical ? "0.35em" : undefined}
              {...pointAt(frame, tick.at, frame.labelOff)}
            >
              {tick.label}
            </text>
          )}
        </g>
      ))}
    </g>
  );
}
