"use client";

import { type Hang, type LabelSide, layFrame, type ValueSide } from "./frame";
import { type IndexRule, plainRule } from "./rule";
import { type RulerIndex, SlidingIndex, StillIndex } from "./ruler-index";
import { RulerLine } from "./ruler-line";
import { type MarksProps, RulerMarks } from "./ruler-marks";
import { placeScale, type RulerScale, snapToHalf } from "./scale";
import { chooseSteps, layTicks, type LinearTicks } from "./ticks";
import { useMeasuredLength } from "./use-measured-length";

export interface RulerProps extends Omit<MarksProps, "frame" | "placement" | "values"> {
  /** What the ruler measures, with its unit: "radius, M". */
  label: string;
  scale: RulerScale;
  /** Pixels along the line. Absent: as long as the place it is given. */
  length?: number;
  /** How a linear ruler is divided, at any length or at a given one; chosen by itself when absent. */
  steps?: LinearTicks | ((length: number) => LinearTicks);
  /** The only values to label. */
  labels?: readonly number[];
  formatLabel?: (value: number) => string;
  indices?: readonly RulerIndex[];
  /** Only whole values, as frames are. */
  whole?: boolean;
  vertical?: boolean;
  hang?: Hang;
  labelSide?: LabelSide;
  valueSide?: ValueSide;
  disabled?: boolean;
  /** Drawn for the eye only, because a role around it already speaks. */
  silent?: boolean;
  className?: string;
}

/** The ruler: radius, angle, frames, exposure, shift, dates, progress. Its indices are sliders when they can be moved. */
export function Ruler(props: RulerProps) {
  const { vertical = false, length: given, label, indices = [], silent, disabled, className = "" } = props;
  const { ref, length: measured } = useMeasuredLength(vertical, given ?? 480);
  const length = given ?? measured;
  const { frame, placement, ticks, rule, values } = layOut(props, length);
  const size = vertical ? { width: frame.breadth, height: length } : { width: length, height: frame.breadth };
  const moves = indices.some(({ onChange }) => onChange) && !disabled;
  const spoken = indices
    .map((index) => `${index.label} ${(index.speak ?? index.format)(index.value)}`)
    .join(", ");
  const voice = silent
    ? { "aria-hidden": true }
    : moves
      ? { role: "group", "aria-label": label }
      : { role: "img", "aria-label": spoken ? `${label}: ${spoken}` : label };
  // Out of the flow, so that a drawing laid out for one length never keeps its place from becoming shorter.
  const box = given ? size : vertical ? { width: size.width } : { height: size.height };
  return (
    <div ref={ref} className={`relative ${vertical ? "h-full" : "w-full min-w-0"} ${className}`} style={box}>
      <svg {...size} {...voice} className="absolute top-0 left-0 overflow-visible select-none">
        <RulerLine {...{ frame, length, ticks, disabled }} />
        {!disabled && <RulerMarks {...props} frame={frame} placement={placement} values={values} />}
        {!disabled &&
          indices.map((index) => {
            const Index = index.onChange ? SlidingIndex : StillIndex;
            return <Index key={index.id} {...{ index, frame, placement }} rule={narrow(rule, index)} />;
          })}
      </svg>
    </div>
  );
}

function layOut(props: RulerProps, length: number) {
  const { scale, labels, vertical = false, hang = "down", indices = [] } = props;
  const { valueSide = "above", labelSide = hang === "up" ? "above" : "beneath" } = props;
  const steps =
    typeof props.steps === "function"
      ? props.steps(length)
      : (props.steps ?? chooseSteps(scale.from, scale.to));
  const placement = placeScale(scale, length);
  const values = indices
    .filter(({ hideValue }) => !hideValue)
    .map(({ value, format }) => ({ at: snapToHalf(placement.at(value)), width: format(value).length * 6.3 }));
  const shared = valueSide === "row" || (valueSide === "above" && labelSide === "above");
  const ticks = layTicks(placement, {
    steps,
    labels,
    format: props.formatLabel,
    taken: shared ? values : [],
  });
  const longTicks = ticks.some((tick) => tick.length === 13);
  const frame = layFrame({ vertical, hang, labelSide, valueSide, longTicks });
  return { placement, ticks, frame, values: valueSide === "above" ? values : [], rule: ruleOf(props, steps) };
}

function ruleOf(
  { scale, snaps = [], hatched = [], whole = false }: RulerProps,
  steps: LinearTicks,
): IndexRule {
  return {
    ...plainRule(scale, steps.fine ?? steps.mid ?? steps.label),
    snaps: snaps.map(({ value }) => value),
    forbidden: hatched.filter(({ forbidden }) => forbidden),
    whole,
  };
}

const narrow = (rule: IndexRule, { min = rule.min, max = rule.max }: RulerIndex): IndexRule => ({
  ...rule,
  min,
  max,
});
