import { placeScale, snapToHalf } from "./scale";

export interface DeviationRulerProps {
  /** Measured less published, in tolerances: ±1 is the edge of what is accepted. */
  deviation: number;
  /** The quantity, for the ear. */
  label: string;
  width?: number;
  /** Write −1 and +1 beneath. A column's head says it once. */
  labelled?: boolean;
}

const reach = 1.5;
const ticks = [-1, -0.5, 0, 0.5, 1];

/** How far a measured quantity lies from the published one. Beyond the ruler an ember index points outward. */
export function DeviationRuler({ deviation, label, width = 96, labelled }: DeviationRulerProps) {
  const { at } = placeScale({ kind: "linear", from: -reach, to: reach }, width);
  const line = 16.5;
  const beyond = Math.abs(deviation) > reach;
  const outside = Math.abs(deviation) > 1;
  const place = snapToHalf(at(Math.min(reach, Math.max(-reach, deviation))));
  const said = `${label}: ${deviation.toFixed(2)} tolerances, ${outside ? "outside" : "within"}`;
  return (
    <svg
      role="img"
      aria-label={said}
      width={width}
      height={labelled ? 36 : 20}
      className="block overflow-visible"
    >
      <line className="stroke-rule" x1={0} y1={line} x2={width} y2={line} />
      <line className="stroke-text" x1={snapToHalf(at(-1))} y1={line} x2={snapToHalf(at(1))} y2={line} />
      {ticks.map((tick) => (
        <line
          key={tick}
          className="stroke-text"
          x1={snapToHalf(at(tick))}
          x2={snapToHalf(at(tick))}
          y1={line}
          y2={line - (Number.isInteger(tick) ? 8 : 4.5)}
        />
      ))}
      <path
        data-index=""
        className={outside ? "fill-ember" : "fill-bright"}
        d={beyond ? (deviation > 0 ? "M-8-5L0 0L-8 5Z" : "M8-5L0 0L8 5Z") : "M-5-9L5-9L0-1Z"}
        transform={
          beyond ? `translate(${deviation > 0 ? width : 0} ${line - 6})` : `translate(${place} ${line})`
        }
      />
      {labelled &&
        [-1, 1].map((end) => (
          <text
            key={end}
            className="type-ruler fill-soft"
            textAnchor="middle"
            x={snapToHalf(at(end))}
            y={line + 14}
          >
            {end < 0 ? "−1" : "+1"}
          </text>
        ))}
    </svg>
  );
}
