// Carlson's symmetric elliptic integrals for real arguments (Carlson 1995, Numer. Algorithms 10, 13; DLMF §19.36),
// and the complete Legendre integrals in the parameter m = k², which may be negative (DLMF §19.25).

/** Relative accuracy asked of the duplication: the series left at the end errs below it. */
const accuracy = 1e-16;

/** R_F(x, y, z) = ½∫₀^∞ dt/√((t+x)(t+y)(t+z)). Domain x, y, z ≥ 0, at most one zero. */
export function carlsonRf(x: number, y: number, z: number): number {
  const a0 = (x + y + z) / 3;
  const spread = Math.max(Math.abs(a0 - x), Math.abs(a0 - y), Math.abs(a0 - z));
  let left = (3 * accuracy) ** (-1 / 6) * spread;
  let a = a0;
  let shrink = 1;
  for (let [xn, yn, zn] = [x, y, z]; left >= Math.abs(a); left /= 4) {
    const lambda = Math.sqrt(xn * yn) + Math.sqrt(xn * zn) + Math.sqrt(yn * zn);
    [xn, yn, zn] = [(xn + lambda) / 4, (yn + lambda) / 4, (zn + lambda) / 4];
    a = (a + lambda) / 4;
    shrink /= 4;
  }
  const u = ((a0 - x) * shrink) / a;
  const v = ((a0 - y) * shrink) / a;
  const w = -u - v;
  const e2 = u * v - w * w;
  const e3 = u * v * w;
  const series = 1 - e2 / 10 + e3 / 14 + (e2 * e2) / 24 - (3 * e2 * e3) / 44;
  return (series - (5 * e2 ** 3) / 208 + (3 * e3 * e3) / 104 + (e2 * e2 * e3) / 16) / Math.sqrt(a);
}

/** R_C(1, 1+e) = R_F(1, 1+e, 1+e), by its elementary form. Domain e > −1. */
function carlsonRcOfOne(e: number): number {
  const s = Math.sqrt(Math.abs(e));
  if (s < 1e-9) return 1;
  return e > 0 ? Math.atan(s) / s : Math.atanh(s) / s;
}

/** R_J(x, y, z, p) = (3/2)∫₀^∞ dt/[√((t+x)(t+y)(t+z)) (t+p)]. Domain x, y, z ≥ 0, at most one zero; p > 0. */
export function carlsonRj(x: number, y: number, z: number, p: number): number {
  const a0 = (x + y + z + 2 * p) / 5;
  const spread = Math.max(Math.abs(a0 - x), Math.abs(a0 - y), Math.abs(a0 - z), Math.abs(a0 - p));
  const product = (p - x) * (p - y) * (p - z);
  let left = (accuracy / 4) ** (-1 / 6) * spread;
  let a = a0;
  let shrink = 1;
  let sum = 0;
  for (let [xn, yn, zn, pn] = [x, y, z, p]; left >= Math.abs(a); left /= 4) {
    const [rx, ry, rz, rp] = [Math.sqrt(xn), Math.sqrt(yn), Math.sqrt(zn), Math.sqrt(pn)];
    const d = (rp + rx) * (rp + ry) * (rp + rz);
    sum += (shrink / d) * carlsonRcOfOne((shrink ** 3 * product) / (d * d));
    const lambda = rx * ry + rx * rz + ry * rz;
    [xn, yn, zn, pn] = [(xn + lambda) / 4, (yn + lambda) / 4, (zn + lambda) / 4, (pn + lambda) / 4];
    a = (a + lambda) / 4;
    shrink /= 4;
  }
  const u = ((a0 - x) * shrink) / a;
  const v = ((a0 - y) * shrink) / a;
  const w = ((a0 - z) * shrink) / a;
  const q = -(u + v + w) / 2;
  const e2 = u * v + u * w + v * w - 3 * q * q;
  const e3 = u * v * w + 2 * e2 * q + 4 * q ** 3;
  const e4 = (2 * u * v * w + e2 * q + 3 * q ** 3) * q;
  const e5 = u * v * w * q * q;
  const low = 1 - (3 * e2) / 14 + e3 / 6 + (9 * e2 * e2) / 88 - (3 * e4) / 22 - (9 * e2 * e3) / 52;
  const high = (3 * e5) / 26 - e2 ** 3 / 16 + (3 * e3 * e3) / 40 + (3 * e2 * e4) / 20;
  const last = (45 * e2 * e2 * e3) / 272 - (9 * (e3 * e4 + e2 * e5)) / 68;
  return (shrink * (low + high + last)) / (a * Math.sqrt(a)) + 6 * sum;
}

/** Complete integral of the first kind K(m) = ∫₀^{π/2} dθ/√(1−m sin²θ). Domain m < 1. */
export function completeK(m: number): number {
  return carlsonRf(0, 1 - m, 1);
}

/** Complete integral of the third kind Π(n|m) = ∫₀^{π/2} dθ/[(1−n sin²θ)√(1−m sin²θ)]. Domain n < 1, m < 1. */
export function completePi(n: number, m: number): number {
  return completeK(m) + (n / 3) * carlsonRj(0, 1 - m, 1, 1 - n);
}

/** ∫₀^K sn²(u|m) du = [K(m) − E(m)]/m, regular at m = 0 (DLMF 22.16.20, 19.25.1). Domain m < 1. */
export function completeSnSquared(m: number): number {
  return carlsonRj(0, 1 - m, 1, 1) / 3;
}
