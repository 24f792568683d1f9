// What a light path starts from and what is known once it is traced. Units G = c = M = 1; angles in radians.
import { createPathWork, type PathWork } from "./path-work";

export type Fate = "captured" | "escaped" | "unresolved";

/** Numeric fates of a record. `stopped` only occurs when the caller asked for an early end. */
export const fates = { captured: 0, escaped: 1, unresolved: 2, stopped: 3 } as const;
export type FateCode = (typeof fates)[keyof typeof fates];

/** Crossings of the equatorial plane that a record lists; further ones are only counted. */
export const listedCrossings = 3;

/**
 * A photon received by an observer: λ = L/E, η = Q/E² (Carter 1968) and the signs of its future-directed p_r and
 * p_θ there. The path is traced from it into the past.
 */
export interface PathStart {
  spin: number;
  rObs: number;
  cosThetaObs: number;
  lambda: number;
  eta: number;
  signPr: 1 | -1;
  signPtheta: 1 | -1;
}

export interface TraceOptions {
  /** Bound on a step's last kept terms, relative to the coordinate's own scale. */
  tolerance?: number;
  /** False leaves dt at zero and costs less. */
  withTime?: boolean;
  /** Stop, with fate `stopped`, at the crossing of this number. */
  stopAfterCrossings?: number;
  /** Stop, with fate `stopped`, at the first crossing whose radius is within [stopInner, stopOuter]: an opaque disk. */
  stopInner?: number;
  stopOuter?: number;
}

/**
 * The outcome of one path. Arrays hold the first `crossingCount` crossings of the equatorial plane.
 * dphi = φ(event) − φ(observer), continuous; dt = t(observer) − t(event) ≥ 0; signs are the future-directed photon's.
 * On the axis dphi counts from the half-plane in which the past-directed path leaves it.
 */
export interface PathRecord {
  fate: FateCode;
  crossingCount: number;
  crossingsTotal: number;
  r: Float64Array;
  dphi: Float64Array;
  dt: Float64Array;
  signPr: Int8Array;
  signPtheta: Int8Array;
  /** Times a path of λ = 0 went through the axis before each crossing, and in all. */
  axisBefore: Int32Array;
  axisPassages: number;
  /** Where on the celestial sphere the light came from; zero unless escaped. */
  cosThetaInf: number;
  dphiInf: number;
  /** Radius of the first radial turning point; zero when there is none. */
  rTurningPoint: number;
  /** Drift of the exact invariants u'² = U and μ'² = M over the path, dimensionless. */
  residual: number;
  steps: number;
  /** Scratch space of the tracer, kept here so that a path allocates nothing. */
  work: PathWork;
}

/** An empty record, to be filled by any number of paths one after another. */
export function createPathRecord(): PathRecord {
  return {
    fate: fates.unresolved,
    crossingCount: 0,
    crossingsTotal: 0,
    r: new Float64Array(listedCrossings),
    dphi: new Float64Array(listedCrossings),
    dt: new Float64Array(listedCrossings),
    signPr: new Int8Array(listedCrossings),
    signPtheta: new Int8Array(listedCrossings),
    axisBefore: new Int32Array(listedCrossings),
    axisPassages: 0,
    cosThetaInf: 0,
    dphiInf: 0,
    rTurningPoint: 0,
    residual: 0,
    steps: 0,
    work: createPathWork(),
  };
}

/** Empties a record before its next path. */
export function clearPathRecord(record: PathRecord): void {
  record.fate = fates.unresolved;
  record.crossingCount = 0;
  record.crossingsTotal = 0;
  record.axisPassages = 0;
  record.cosThetaInf = 0;
  record.dphiInf = 0;
  record.rTurningPoint = 0;
  record.residual = 0;
  record.steps = 0;
}
