// The Kerr metric in Boyer–Lindquist coordinates. Symbols follow Bardeen, Press & Teukolsky 1972 (ApJ 178, 347,
// eqs. 2.1–2.8, cited as BPT). Units G = c = M = 1; signature (−, +, +, +); r outside the outer horizon.

/** sin²θ from cos θ, as (1−cos θ)(1+cos θ) so that it keeps its digits near the axis. */
export function sinSquared(cosTheta: number): number {
  return (1 - cosTheta) * (1 + cosTheta);
}

/** Σ = r² + a²cos²θ, in M² (BPT eq. 2.3). */
export function sigma(a: number, r: number, cosTheta: number): number {
  return r * r + a * a * cosTheta * cosTheta;
}

/** Δ = r² − 2r + a², in M² (BPT eq. 2.3). Zero on the horizons, negative between them. */
export function delta(a: number, r: number): number {
  return r * r - 2 * r + a * a;
}

/** A = (r²+a²)² − a²Δ sin²θ, formed as Σ(r²+a²) + 2ra²sin²θ, in M⁴ (BPT eq. 2.3). */
export function bigA(a: number, r: number, cosTheta: number): number {
  return sigma(a, r, cosTheta) * (r * r + a * a) + 2 * r * a * a * sinSquared(cosTheta);
}

/** Angular velocity ω = 2ar/A at which the hole drags frames round, in 1/M (BPT eq. 2.6). */
export function frameDragging(a: number, r: number, cosTheta: number): number {
  return (2 * a * r) / bigA(a, r, cosTheta);
}

/** Lapse √(ΔΣ/A): clock rate of the zero-angular-momentum observer, dimensionless (BPT eq. 2.6). NaN inside r₊. */
export function lapse(a: number, r: number, cosTheta: number): number {
  return Math.sqrt((delta(a, r) * sigma(a, r, cosTheta)) / bigA(a, r, cosTheta));
}

/** √g_φφ = √(A/Σ) sin θ: circumference over 2π, in M. Zero on the axis. */
export function axialRadius(a: number, r: number, cosTheta: number): number {
  return Math.sqrt((bigA(a, r, cosTheta) * sinSquared(cosTheta)) / sigma(a, r, cosTheta));
}

export interface Metric {
  tt: number;
  tphi: number;
  rr: number;
  thth: number;
  phph: number;
}

/** The non-zero components of g in (t, r, θ, φ) (BPT eq. 2.2). g_tφ² − g_tt g_φφ = Δ sin²θ. */
export function metric(a: number, r: number, cosTheta: number): Metric {
  const s = sigma(a, r, cosTheta);
  const sin2 = sinSquared(cosTheta);
  return {
    tt: -(1 - (2 * r) / s),
    tphi: (-2 * a * r * sin2) / s,
    rr: s / delta(a, r),
    thth: s,
    phph: (bigA(a, r, cosTheta) * sin2) / s,
  };
}

/** g(x, y) of two vectors given by their (t, r, θ, φ) components. */
export function innerProduct(g: Metric, x: readonly number[], y: readonly number[]): number {
  const [xt = 0, xr = 0, xth = 0, xph = 0] = x;
  const [yt = 0, yr = 0, yth = 0, yph = 0] = y;
  return (
    g.tt * xt * yt + g.tphi * (xt * yph + xph * yt) + g.rr * xr * yr + g.thth * xth * yth + g.phph * xph * yph
  );
}
