// What a pointer does to an index: the value under it, drawn to a snap mark that is near.
import { constrain, type IndexRule, roundToGrain } from "./rule";
import type { Placement } from "./scale";

const snapReach = 6;

/** The value a pointer at `pixel` along the line means. Held free of the snap marks when `free`. */
export function valueUnderPointer(
  pixel: number,
  placement: Placement,
  rule: IndexRule,
  free = false,
): number {
  const inside = Math.min(placement.length, Math.max(0, pixel));
  const near = free ? [] : rule.snaps.filter((snap) => Math.abs(placement.at(snap) - inside) <= snapReach);
  const [snap] = near.sort((a, b) => Math.abs(placement.at(a) - inside) - Math.abs(placement.at(b) - inside));
  return constrain(snap ?? roundToGrain(placement.valueAt(inside), rule), rule);
}
