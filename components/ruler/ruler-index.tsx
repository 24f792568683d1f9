import { indexPath, pointAt, type RulerFrame } from "./frame";
import type { IndexRule } from "./rule";
import { type Placement, snapToHalf } from "./scale";
import { useIndex } from "./use-index";

export interface RulerIndex {
  id: string;
  /** What it sets, as it is spoken: "camera radius". */
  label: string;
  value: number;
  /** The value to its real precision, with its unit. */
  format: (value: number) => string;
  /** The same in words for the ear, where a unit is a letter: "34.0 gravitational radii". */
  speak?: (value: number) => string;
  /** Absent for an index that only shows. */
  onChange?: (value: number) => void;
  onCommit?: (value: number) => void;
  min?: number;
  max?: number;
  tone?: "bright" | "ember";
  /** The value is shown elsewhere. */
  hideValue?: boolean;
}

export interface RulerIndexProps {
  index: RulerIndex;
  rule: IndexRule;
  frame: RulerFrame;
  placement: Placement;
}

const fills = { bright: "fill-bright", ember: "fill-ember" };

/** An index that only shows its value. */
export function StillIndex({ index, frame, placement }: RulerIndexProps) {
  const place = pointAt(frame, snapToHalf(placement.at(index.value)), 0);
  return (
    <g
      className="transition-transform"
      style={{ transform: `translate(${place.x}px, ${place.y}px)` }}
      data-index={index.id}
    >
      <path className={fills[index.tone ?? "bright"]} d={indexPath(frame.vertical)} />
      {!index.hideValue && <ValueText text={index.format(index.value)} frame={frame} />}
    </g>
  );
}

/** An index that is moved by pointer or keyboard. */
export function SlidingIndex({ index, rule, frame, placement }: RulerIndexProps) {
  const { value, onChange, onCommit } = index;
  const { mode, boxed, handlers } = useIndex({
    value,
    rule,
    placement,
    vertical: frame.vertical,
    onChange,
    onCommit,
  });
  const place = pointAt(frame, snapToHalf(placement.at(value)), 0);
  const nearEnd = placement.at(value) > placement.length - 96;
  const text = mode.kind === "type" ? `${mode.text}|` : index.format(value);
  return (
    <>
      {mode.kind === "drag" && mode.origin !== value && (
        <Origin {...{ frame, placement }} value={mode.origin} />
      )}
      <g
        role="slider"
        tabIndex={0}
        aria-label={index.label}
        aria-orientation={frame.vertical ? "vertical" : "horizontal"}
        aria-valuemin={rule.min}
        aria-valuemax={rule.max}
        aria-valuenow={value}
        aria-valuetext={mode.kind === "type" ? `typing ${mode.text}` : (index.speak ?? index.format)(value)}
        data-index={index.id}
        className={`touch-none outline-none ${frame.vertical ? "cursor-ns-resize" : "cursor-ew-resize"} ${mode.kind === "drag" ? "" : "transition-transform"}`}
        style={{ transform: `translate(${place.x}px, ${place.y}px)` }}
        {...handlers}
      >
        <rect
          data-target=""
          fill="transparent"
          x={frame.vertical ? -8 : -12}
          y={frame.vertical ? -12 : -16}
          width={24}
          height={24}
        />
        {boxed && <FocusBox vertical={frame.vertical} />}
        <path className={fills[index.tone ?? "bright"]} d={indexPath(frame.vertical)} />
        {(!index.hideValue || mode.kind === "type") && (
          <ValueText text={text} frame={frame} beside={boxed ? (nearEnd ? "left" : "right") : undefined} />
        )}
      </g>
    </>
  );
}

function Origin({ frame, placement, value }: { frame: RulerFrame; placement: Placement; value: number }) {
  const { x, y } = pointAt(frame, snapToHalf(placement.at(value)), 0);
  return (
    <path
      data-origin=""
      className="fill-ground stroke-text"
      d={indexPath(frame.vertical)}
      transform={`translate(${x} ${y})`}
    />
  );
}

function FocusBox({ vertical }: { vertical: boolean }) {
  const place = vertical
    ? { x: -5, y: -11, width: 27, height: 22 }
    : { x: -11, y: -21, width: 22, height: 27 };
  return <rect data-focus-box="" className="fill-none stroke-bright" strokeWidth={2} {...place} />;
}

function ValueText({
  text,
  frame,
  beside,
}: {
  text: string;
  frame: RulerFrame;
  beside?: "left" | "right" | undefined;
}) {
  const className = "type-ruler fill-bright font-semibold";
  if (frame.vertical)
    return (
      <text className={className} x={beside ? 26 : 12} dy="0.35em">
        {text}
      </text>
    );
  if (!beside || frame.valueOff > 0)
    return (
      <text className={className} textAnchor="middle" y={frame.valueOff}>
        {text}
      </text>
    );
  const right = beside === "right";
  return (
    <text className={className} textAnchor={right ? "start" : "end"} x={right ? 16 : -16} y={-10}>
      {text}
    </text>
  );
}
