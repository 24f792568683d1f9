// The readable reference tracer: one light path, from an observer into the past, by Taylor series in Mino time.
// Variables u = 1/r and μ = cos θ have neither square roots nor sign changes at turning points (PHYSICS §3).
import { followPath } from "./follow-path";
import {
  clearPathRecord,
  createPathRecord,
  fates,
  type Fate,
  type PathRecord,
  type PathStart,
  type TraceOptions,
} from "./light-path";
import { polarPotential, radialPotential, setMotion } from "./motion";
import { stride, type PathWork } from "./path-work";
import { addAzimuthAndTime } from "./path-integrals";
import { terms } from "./series";

const defaults: TraceOptions = {};

/**
 * Traces one path and fills `record`. Never throws: what cannot be traced ends `unresolved`. Allocates nothing.
 * rObs = Infinity is an observer at infinity, for whom dt stays zero.
 */
export function traceInto(start: PathStart, record: PathRecord, options: TraceOptions = defaults): void {
  clearPathRecord(record);
  const { work } = record;
  if (!setMotion(start, work)) return;
  followPath(record, options);
  if (record.fate === fates.escaped || record.crossingCount > 0)
    addAzimuthAndTime(record, (options.withTime ?? true) && start.rObs < Infinity);
  record.residual = invariantDrift(work, record.fate === fates.unresolved ? record.steps - 1 : record.steps);
}

/** How far the state after so many whole steps has drifted from u'² = U and μ'² = M, each on its own scale. */
function invariantDrift(work: PathWork, steps: number): number {
  const { motion, series } = work;
  const at = steps * stride;
  const uSlope = motion.scale * series[at + 1]!;
  const muSlope = series[at + terms + 1]!;
  const radial = uSlope * uSlope - radialPotential(motion.spin, motion.lambda, motion.eta, series[at]!);
  const polar = polarPotential(motion.spin, motion.lambda, motion.eta, series[at + terms]!);
  const square = motion.scale * motion.scale;
  const radialScale = 1 + square * series[at]! * series[at]!;
  return Math.max(Math.abs(radial) / radialScale, Math.abs(muSlope * muSlope - polar / square));
}

/** One crossing of the equatorial plane, in the words of the published check values. */
export interface Crossing {
  r: number;
  dt: number;
  sign_pr: number;
  sign_ptheta: number;
  dphi: number;
  /** Only where λ = 0: dphi within (−π, π], and the passages through the axis before this crossing. */
  dphi_mod_2pi?: number;
  axis_passages?: number;
}

/** A traced path as a plain object; angles in radians unless named otherwise. */
export interface LightPath {
  fate: Fate | "stopped";
  equatorial_crossings_total: number;
  crossings: Crossing[];
  theta_inf_deg?: number;
  cos_theta_inf?: number;
  dphi_inf?: number;
  dphi_inf_mod_2pi?: number;
  axis_passages_total?: number;
  r_turning_point?: number;
}

const fateNames = ["captured", "escaped", "unresolved", "stopped"] as const;

/** Within (−π, π]. */
function foldAngle(phi: number): number {
  return phi - 2 * Math.PI * Math.ceil(phi / (2 * Math.PI) - 0.5);
}

/** Traces one path and describes it: for people, files and tests rather than for pixels. */
export function tracePath(start: PathStart, options: TraceOptions = defaults): LightPath {
  const record = createPathRecord();
  traceInto(start, record, options);
  const onAxis = start.lambda === 0;
  const path: LightPath = {
    fate: fateNames[record.fate],
    equatorial_crossings_total: record.crossingsTotal,
    crossings: Array.from({ length: record.crossingCount }, (_, k) => ({
      r: record.r[k]!,
      dt: record.dt[k]!,
      sign_pr: record.signPr[k]!,
      sign_ptheta: record.signPtheta[k]!,
      dphi: record.dphi[k]!,
      ...(onAxis && { dphi_mod_2pi: foldAngle(record.dphi[k]!), axis_passages: record.axisBefore[k]! }),
    })),
  };
  if (record.rTurningPoint > 0) path.r_turning_point = record.rTurningPoint;
  if (record.fate !== fates.escaped) return path;
  path.theta_inf_deg = (Math.acos(record.cosThetaInf) * 180) / Math.PI;
  path.cos_theta_inf = record.cosThetaInf;
  path.dphi_inf = record.dphiInf;
  if (onAxis) {
    path.dphi_inf_mod_2pi = foldAngle(record.dphiInf);
    path.axis_passages_total = record.axisPassages;
  }
  return path;
}
