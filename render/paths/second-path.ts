// A second opinion on a light path, sharing no code with the tracer: Hamilton's equations in Cartesian Kerr–Schild
// coordinates (Kerr 1963; Misner, Thorne & Wheeler 1973 box 33.2; PHYSICS §4), integrated by odex (Hairer & Wanner's
// extrapolation code). With s = +1 for outgoing coordinates, −1 for ingoing: f = 2r³/(r⁴+a²z²),
// n = s((rx−s·ay)/(r²+a²), (ry+s·ax)/(r²+a²), z/r), H = ½[|p|² − p_t² − f(p_t + n·p)²].
import { Solver } from "odex";
import type { PathStart } from "./light-path";

export interface SecondPath {
  fate: "captured" | "escaped" | "unresolved";
  /** Equatorial crossings in order: Boyer–Lindquist r, azimuth modulo 2π, and delay in M. */
  crossings: { r: number; dphiMod2pi: number; dt: number }[];
  /** Direction on the celestial sphere, when escaped; azimuth modulo 2π. */
  cosThetaInf?: number;
  dphiInfMod2pi?: number;
}

/** Far enough that what is left of the bending, of order b/r², is below every tolerance. */
const farAway = 1e7;
const tolerance = 1e-13;

/** x, y, z, t and the covariant p_x, p_y, p_z; p_t = −(sign of E) is constant. */
type State = number[];

/** r from Cartesian coordinates: r² = (b + √(b²+4a²z²))/2, b = x²+y²+z²−a². */
function radiusOf(a: number, x: number, y: number, z: number): number {
  const b = x * x + y * y + z * z - a * a;
  const root = Math.sqrt(b * b + 4 * a * a * z * z);
  return Math.sqrt(b > 0 ? 0.5 * (b + root) : (2 * a * a * z * z) / (root - b));
}

/** What stays the same along a path: spin, p_t, and s, the sign of the photon's p_r where it is received. */
interface Frame {
  a: number;
  pt: number;
  s: 1 | -1;
}

/** d(state)/dw into the past, dw = dσ/r with σ the affine parameter: Hamilton's equations. */
function derivative({ a, pt, s }: Frame, state: State): State {
  const [x = 0, y = 0, z = 0, , px = 0, py = 0, pz = 0] = state;
  const r = radiusOf(a, x, y, z);
  const rr = r * r + a * a;
  const quartic = r ** 4 + a * a * z * z;
  const f = (2 * r ** 3) / quartic;
  const n = [(s * r * x - a * y) / rr, (s * r * y + a * x) / rr, (s * z) / r] as const;
  const flat = n[0] * px + n[1] * py;
  const w = pt + flat + n[2] * pz;

  // Gradients of r, then those of f and n·p: through r, and explicit.
  const stretch = r / (r * r + (a * a * z * z) / (r * r));
  const dr = [x * stretch, y * stretch, (z * rr * stretch) / (r * r)] as const;
  const fThroughR = f * (3 / r - (4 * r ** 3) / quartic);
  const npThroughR = s * ((x * px + y * py) / rr - (z * pz) / (r * r)) - (2 * r * flat) / rr;
  const fExplicit = [0, 0, (-2 * a * a * z * f) / quartic] as const;
  const npExplicit = [(s * r * px + a * py) / rr, (s * r * py - a * px) / rr, (s * pz) / r] as const;
  const force = (i: 0 | 1 | 2) =>
    0.5 * w * w * (dr[i] * fThroughR + fExplicit[i]) + f * w * (dr[i] * npThroughR + npExplicit[i]);

  const past = -r;
  return [
    past * (px - f * w * n[0]),
    past * (py - f * w * n[1]),
    past * (pz - f * w * n[2]),
    past * (-pt - f * w),
    past * force(0),
    past * force(1),
    past * force(2),
  ];
}

/** Boyer–Lindquist t and φ less their Kerr–Schild namesakes, at r: s∫2r/Δ dr and s∫a/Δ dr. */
function offsets({ a, s }: Frame, r: number): { t: number; phi: number } {
  const half = Math.sqrt(1 - a * a);
  const [outer, inner] = [Math.log(r - 1 - half), Math.log(r - 1 + half)];
  return {
    t: (s * ((1 + half) * outer - (1 - half) * inner)) / half,
    phi: (s * a * (outer - inner)) / (2 * half),
  };
}

/** The Kerr–Schild azimuth of a point: arg(x + iy) = φ − s·arctan(a/r). */
function azimuthOf({ a, s }: Frame, [x = 0, y = 0, z = 0]: State): number {
  return Math.atan2(y, x) + s * Math.atan2(a, radiusOf(a, x, y, z));
}

/**
 * p_r in Kerr–Schild coordinates, s(√R − |E|⁻¹E(2r − aλ))/Δ per unit |E|, formed so that nothing cancels near the
 * horizon: R − (2r−aλ)² = Δ[r²+a²+2r−2aλ−η−(λ−a)²].
 */
function radialMomentum({ a, pt, s }: Frame, r: number, lambda: number, eta: number, root: number): number {
  const other = -pt * (2 * r - a * lambda);
  const rr = r * r + a * a;
  if (other <= 0) return (s * (root - other)) / (rr - 2 * r);
  return (s * (rr + 2 * r - 2 * a * lambda - eta - (lambda - a) ** 2)) / (root + other);
}

/** Initial state of a received photon at φ_KS = 0, t_KS = 0; null when no such photon exists. */
function initialState(start: PathStart): { state: State; frame: Frame } | null {
  const { spin: a, rObs: r, cosThetaObs: mu, lambda, eta } = start;
  const sin = Math.sqrt((1 - mu) * (1 + mu));
  const rr = r * r + a * a;
  const delta = rr - 2 * r;
  if (!(delta > 0 && r > 1)) return null;
  const carter = eta + (lambda - a) ** 2;
  const radial = (rr - a * lambda) ** 2 - delta * carter;
  const polar = eta + mu * mu * (a * a - (sin === 0 ? 0 : (lambda / sin) ** 2));
  const rounding = 1e-9 * (rr * rr + delta * Math.abs(carter));
  if (!(radial >= -rounding) || !(polar >= -rounding)) return null;

  // E < 0 where the future-directed photon would otherwise have p^t < 0.
  const energy = rr * rr - a * a * delta * sin * sin - 2 * a * r * lambda < 0 ? -1 : 1;
  const frame: Frame = { a, pt: -energy, s: start.signPr };
  const pr = radialMomentum(frame, r, lambda, eta, Math.sqrt(Math.max(0, radial)));
  const ptheta = start.signPtheta * Math.sqrt(Math.max(0, polar));

  // The rows of ∂(x, y, z)/∂(r, θ, φ) at φ = 0 give p_r, p_θ and, divided by sin θ, p_φ; α is r p_x − a_s p_y.
  const as = frame.s * a;
  const twist = sin === 0 ? 0 : (energy * lambda) / sin;
  const left = pr - (sin * as * twist) / rr;
  const determinant = -((r * sin) ** 2) / rr - mu * mu;
  const alpha = (-r * sin * left - mu * ptheta) / determinant;
  const pz = ((sin * r * ptheta) / rr - mu * left) / determinant;
  const px = (r * alpha + as * twist) / rr;
  const py = (r * twist - as * alpha) / rr;
  return { state: [r * sin, -as * sin, r * mu, 0, px, py, pz], frame };
}

function createSolver(): Solver {
  const solver = new Solver(7);
  solver.relativeTolerance = tolerance;
  solver.absoluteTolerance = tolerance;
  solver.maxExtrapolationColumns = 12;
  solver.maxSteps = 20_000;
  return solver;
}

/** The state where z = 0, from one shortly before it: z itself becomes the independent variable (Hénon 1982). */
function stateAtEquator(frame: Frame, before: State): State {
  const solver = createSolver();
  solver.initialStepSize = Math.abs(before[2]!) / 4;
  const perZ = (z: number, state: State) => {
    const rates = derivative(frame, [...state.slice(0, 2), z, ...state.slice(3)]);
    return rates.map((rate) => rate / rates[2]!);
  };
  return solver.solve(perZ, before[2]!, before, 0).y;
}

const foldAngle = (phi: number) => phi - 2 * Math.PI * Math.ceil(phi / (2 * Math.PI) - 0.5);

/**
 * Traces one path independently of the tracer. Azimuths are modulo 2π; on the axis they count from the half-plane in
 * which the path leaves it. Slow (milliseconds): for checks. `unresolved` when no such photon exists or it lingers.
 */
export function traceSecondPath(start: PathStart): SecondPath {
  const { spin: a } = start;
  const initial = initialState(start);
  const path: SecondPath = { fate: "unresolved", crossings: [] };
  if (!initial) return path;
  const { state: first, frame } = initial;
  const horizon = 1 + Math.sqrt(1 - a * a);
  const begun = offsets(frame, start.rObs);
  const azimuth = (state: State, r: number) =>
    foldAngle(azimuthOf(frame, state) + offsets(frame, r).phi - begun.phi);

  let before = first;
  const solver = createSolver();
  solver.solve(
    (_, state) => derivative(frame, state),
    0,
    first,
    1e6,
    (count, _, __, state) => {
      if (count === 1) return true;
      const [x = 0, y = 0, z = 0, , px = 0, py = 0, pz = 0] = state;
      const r = radiusOf(a, x, y, z);
      if (before[2]! * z < 0) {
        const there = stateAtEquator(frame, before);
        const rThere = Math.sqrt(there[0]! ** 2 + there[1]! ** 2 - a * a);
        const dt = -(there[3]! + offsets(frame, rThere).t - begun.t);
        if (rThere > horizon) path.crossings.push({ r: rThere, dphiMod2pi: azimuth(there, rThere), dt });
      }
      before = state;
      if (!(r > horizon * (1 + 1e-9))) path.fate = "captured";
      else if (r > farAway && x * px + y * py + z * pz < 0) {
        const length = Math.sqrt(px * px + py * py + pz * pz);
        path.fate = "escaped";
        path.cosThetaInf = -pz / length;
        path.dphiInfMod2pi = foldAngle(Math.atan2(-py, -px) - begun.phi);
      }
      return path.fate === "unresolved";
    },
  );
  return path;
}
