// The thin disk: flux and temperature of Page & Thorne 1974 (ApJ 191, 499, eqs. 12 and 15n, numbers from memory),
// cited as PT. Units G = c = M = 1 unless a name says SI. A retrograde disk is the formulas' a < 0.
import { iscoEnergy, iscoRadius, senseSign, type Sense } from "../spacetime/orbits";
import {
  gravitationalRadius,
  newtonG,
  protonMass,
  solarMassesToKg,
  speedOfLight,
  stefanBoltzmann,
  thomsonCrossSection,
} from "../units";

/** What a disk's flux needs at every radius, worked out once per spin and sense. */
export interface ThinDisk {
  /** ±a: positive when the disk turns with the hole. */
  spin: number;
  isco: number;
  /** x₀ = √r_isco and the roots x₁, x₂, x₃ of x³ − 3x + 2a. */
  x0: number;
  roots: readonly [number, number, number];
  /** The three logarithms' factors 3(x_i−a)²/[x_i(x_i−x_j)(x_i−x_k)]. */
  factors: readonly [number, number, number];
  /** Where the flux is greatest, in M, and F/Ṁ there, in c⁶/(GM)². */
  peakRadius: number;
  peakFlux: number;
}

type FluxLaw = Omit<ThinDisk, "peakRadius" | "peakFlux">;

/**
 * A Page–Thorne disk with no torque on its inner edge, the innermost stable orbit. Domain 0 ≤ a < 1.
 * Roots: x₁ = 2cos(⅓arccos a − π/3), x₃ = −2cos(⅓arccos a), and x₂ from x₁x₂x₃ = −2a so that a = 0 is no exception.
 */
export function createThinDisk(a: number, sense: Sense): ThinDisk {
  const spin = senseSign(sense) * a;
  const isco = iscoRadius(a, sense);
  const third = Math.acos(spin) / 3;
  const x1 = 2 * Math.cos(third - Math.PI / 3);
  const x3 = -2 * Math.cos(third);
  const share = -2 / (x1 * x3);
  const x2 = spin * share;
  const law: FluxLaw = {
    spin,
    isco,
    x0: Math.sqrt(isco),
    roots: [x1, x2, x3],
    factors: [
      (3 * (x1 - spin) ** 2) / (x1 * (x1 - x2) * (x1 - x3)),
      (3 * spin * (share - 1) ** 2) / (share * (x2 - x1) * (x2 - x3)),
      (3 * (x3 - spin) ** 2) / (x3 * (x3 - x1) * (x3 - x2)),
    ],
  };
  const peakRadius = findPeak(law);
  return { ...law, peakRadius, peakFlux: diskFlux(law, peakRadius) };
}

/**
 * F/Ṁ leaving one face, in the disk's own rest frame, in c⁶/(GM)² (PT eqs. 12, 15n): F = Ṁ f/(4πr),
 * f = 3/{2x²(x³−3x+2a)} {x − x₀ − (3/2)a ln(x/x₀) − Σ factor_i ln[(x−x_i)/(x₀−x_i)]}. Zero at and inside the
 * innermost stable orbit.
 */
export function diskFlux(disk: FluxLaw, r: number): number {
  if (!(r > disk.isco)) return 0;
  const { spin, x0, roots, factors } = disk;
  const x = Math.sqrt(r);
  const further = x - x0;
  let bracket = further - 1.5 * spin * Math.log1p(further / x0);
  bracket -= factors[0] * Math.log1p(further / (x0 - roots[0]));
  bracket -= factors[1] * Math.log1p(further / (x0 - roots[1]));
  bracket -= factors[2] * Math.log1p(further / (x0 - roots[2]));
  const f = (1.5 * bracket) / (r * (x * r - 3 * x + 2 * spin));
  return Math.max(0, f) / (4 * Math.PI * r);
}

/** T/T_max = (F/F_max)^¼: the disk's temperature in its own frame as a part of its highest. Dimensionless. */
export function temperatureRatio(disk: ThinDisk, r: number): number {
  return Math.sqrt(Math.sqrt(diskFlux(disk, r) / disk.peakFlux));
}

/** The radius of greatest flux: golden section between the inner edge and four times it, then a parabola's vertex. */
function findPeak(law: FluxLaw): number {
  const golden = (Math.sqrt(5) - 1) / 2;
  let low = law.isco;
  let high = 4 * law.isco;
  while (high - low > 1e-4 * low) {
    const left = high - golden * (high - low);
    const right = low + golden * (high - low);
    if (diskFlux(law, left) < diskFlux(law, right)) low = left;
    else high = right;
  }
  return vertexNear(law, 0.5 * (low + high));
}

/** Newton's method on dF/dr by central differences of fourth order; each round shrinks what rounding leaves. */
function vertexNear(law: FluxLaw, near: number): number {
  let r = near;
  const h = 2e-3 * (near - law.isco);
  for (let round = 0; round < 8; round++) {
    const [f2, f1, f0, g1, g2] = [-2, -1, 0, 1, 2].map((k) => diskFlux(law, r + k * h)) as [
      number,
      number,
      number,
      number,
      number,
    ];
    const slope = (f2 - 8 * f1 + 8 * g1 - g2) / (12 * h);
    const bend = (-f2 + 16 * f1 - 30 * f0 + 16 * g1 - g2) / (12 * h * h);
    r -= slope / bend;
  }
  return r;
}

/**
 * Eddington accretion rate L_Edd/(efficiency · c²) in kg/s, L_Edd = 4πGMm_p c/σ_T, efficiency 1 − E_isco
 * (hydrogen, electron scattering; common practice).
 */
export function eddingtonRate(massSolar: number, a: number, sense: Sense): number {
  const mass = solarMassesToKg(massSolar);
  const luminosity = (4 * Math.PI * newtonG * mass * protonMass * speedOfLight) / thomsonCrossSection;
  return luminosity / ((1 - iscoEnergy(a, sense)) * speedOfLight ** 2);
}

/** The disk's highest temperature in K for an accretion rate in kg/s: σT⁴ = F (PT; effective temperature). */
export function peakTemperatureForAccretion(
  massSolar: number,
  a: number,
  sense: Sense,
  kgPerSecond: number,
): number {
  const perRate = createThinDisk(a, sense).peakFlux * fluxUnit(massSolar);
  return ((perRate * kgPerSecond) / stefanBoltzmann) ** 0.25;
}

/** The accretion rate in kg/s that gives the disk a highest temperature in K: the inverse of the above. */
export function accretionForPeakTemperature(
  massSolar: number,
  a: number,
  sense: Sense,
  temperatureK: number,
): number {
  const perRate = createThinDisk(a, sense).peakFlux * fluxUnit(massSolar);
  return (stefanBoltzmann * temperatureK ** 4) / perRate;
}

/** c⁶/(GM)² per unit rate: W m⁻² per kg/s. */
function fluxUnit(massSolar: number): number {
  return speedOfLight ** 2 / gravitationalRadius(massSolar) ** 2;
}
