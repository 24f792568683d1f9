// The tracer's scratch space: one per record, so that tracing is re-entrant and allocates nothing.
import { terms } from "./series";

/** Steps after which a path is given up as unresolved: some hundred half-orbits about the hole. */
export const stepLimit = 400;

/** Numbers one step occupies: the series of u, then that of μ. */
export const stride = 2 * terms;

/** Constants of one path, in scaled Mino time s = scale · τ unless said otherwise (PHYSICS §3). */
export interface Motion {
  spin: number;
  lambda: number;
  eta: number;
  /** b = √(η + λ² + a² + 1): both coordinates change by order one per unit of s. */
  scale: number;
  /** 1/r₊, where the path is lost. */
  uHorizon: number;
  /** Sign of the photon's energy at infinity: negative only for light from within the ergosphere. */
  energySign: number;
  /** Of the polar azimuth's integrand, twist·μ²/(base + square·μ²): λa², η, a²; inert when η ≤ 0. */
  polarTwist: number;
  polarBase: number;
  polarSquare: number;
  /** α, β, γ of u'' = αu + βu² + γu³, then those of μ''. */
  force: Float64Array;
}

export interface PathWork {
  motion: Motion;
  /** Every step's series; its first two terms are the state at the step's start. */
  series: Float64Array;
  /** Length of each step. */
  length: Float64Array;
  /** Step in which each listed crossing lies, and where in it. */
  crossingStep: Int32Array;
  crossingAt: Float64Array;
  /** Running integrals over the path: azimuth and delay beyond their closed forms, and Π u^σ. One number each. */
  azimuth: Float64Array;
  delay: Float64Array;
  ratio: Float64Array;
  /** u, u' and μ at the eight quadrature nodes, and u where the stretch begins. */
  samples: Float64Array;
  radius: Float64Array;
  /** Ends of the stretch being integrated. */
  span: Float64Array;
}

export function createPathWork(): PathWork {
  return {
    motion: {
      spin: NaN,
      lambda: NaN,
      eta: NaN,
      scale: NaN,
      uHorizon: NaN,
      energySign: NaN,
      polarTwist: NaN,
      polarBase: NaN,
      polarSquare: NaN,
      force: new Float64Array(6),
    },
    series: new Float64Array((stepLimit + 1) * stride),
    length: new Float64Array(stepLimit),
    crossingStep: new Int32Array(3),
    crossingAt: new Float64Array(3),
    azimuth: new Float64Array(1),
    delay: new Float64Array(1),
    ratio: new Float64Array(1),
    samples: new Float64Array(24),
    radius: new Float64Array(1),
    span: new Float64Array(2),
  };
}
