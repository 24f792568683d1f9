// Free fall from rest at infinity (E = 1, L = Q = 0): u^r = −√(2r(r²+a²))/Σ, u^φ = 2ar/(ΣΔ), u^t = A/(ΣΔ), θ fixed
// (PHYSICS §5, "rain"; Misner, Thorne & Wheeler 1973 §33.5). Lengths and times in M.
import { bigA, sigma } from "./kerr";
import { innerHorizon, outerHorizon } from "./orbits";
import { nodes, weights } from "./quadrature";

/** Where a camera is after some of its own time; or that it has reached the horizon by then, and when it did. */
export type CameraPlace =
  | { reached: "place"; radius: number; cosTheta: number; phi: number; t: number }
  | { reached: "horizon"; properTime: number };

/** ln(r − r₊) at which the horizon is as good as reached: a distance below double precision. */
const atHorizon = -40;

/** Proper time, azimuth and coordinate time gained per unit of y = ln(r − r₊), outwards. All smooth in y. */
function rates(a: number, cosTheta: number, y: number): readonly [number, number, number] {
  const above = Math.exp(y);
  const r = outerHorizon(a) + above;
  const speed = Math.sqrt(2 * r * (r * r + a * a));
  // (r − r₊)/Δ = 1/(r − r₋) takes the pole away.
  const regular = 1 / (r - innerHorizon(a));
  return [
    (sigma(a, r, cosTheta) * above) / speed,
    (2 * a * r * regular) / speed,
    (bigA(a, r, cosTheta) * regular) / speed,
  ];
}

/** [τ, φ, t] gained falling from y = `upper` to `lower`: eight-point Gauss–Legendre on stretches of at most one. */
function gained(a: number, cosTheta: number, upper: number, lower: number): [number, number, number] {
  const count = Math.max(1, Math.ceil(Math.abs(upper - lower)));
  const width = (upper - lower) / count;
  const total: [number, number, number] = [0, 0, 0];
  for (let stretch = 0; stretch < count; stretch++)
    for (let i = 0; i < nodes.length; i++) {
      const rate = rates(a, cosTheta, lower + width * (stretch + nodes[i]!));
      for (let k = 0; k < 3; k++) total[k]! += width * weights[i]! * rate[k]!;
    }
  return total;
}

/** Proper time in which a camera falling freely from rest at infinity goes from `radius` to the horizon, in M. */
export function fallTime(a: number, radius: number, cosTheta: number): number {
  return gained(a, cosTheta, Math.log(radius - outerHorizon(a)), atHorizon)[0];
}

/**
 * Where the falling camera is after `properTime` (negative: where it was). Newton's method on τ(y) within a bracket,
 * to rounding. Domain radius > r₊.
 */
export function fallFor(a: number, radius: number, cosTheta: number, properTime: number): CameraPlace {
  const top = Math.log(radius - outerHorizon(a));
  const toHorizon = fallTime(a, radius, cosTheta);
  if (properTime >= toHorizon) return { reached: "horizon", properTime: toHorizon };
  if (properTime === 0) return { reached: "place", radius, cosTheta, phi: 0, t: 0 };

  let low = atHorizon;
  let high = top;
  while (gained(a, cosTheta, top, high)[0] > properTime) high += 1;
  let y = high === top ? top : 0.5 * (low + high);
  for (let round = 0; round < 200; round++) {
    const excess = gained(a, cosTheta, top, y)[0] - properTime;
    if (excess > 0) low = y;
    else high = y;
    const next = y + excess / rates(a, cosTheta, y)[0];
    const moved = next > low && next < high ? next : 0.5 * (low + high);
    if (Math.abs(moved - y) <= 4e-16 * Math.max(1, Math.abs(y))) break;
    y = moved;
  }
  const [, phi, t] = gained(a, cosTheta, top, y);
  return { reached: "place", radius: outerHorizon(a) + Math.exp(y), cosTheta, phi, t };
}
