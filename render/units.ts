// Constants of nature and the conversion between G = c = M = 1 and SI.
// CODATA 2018 (Tiesinga et al. 2021, Rev. Mod. Phys. 93, 025010) and IAU 2012 B2, 2015 B3 nominal values.

/** Speed of light, m/s (exact). */
export const speedOfLight = 299_792_458;
/** Newton's constant, m³ kg⁻¹ s⁻² (CODATA 2018). */
export const newtonG = 6.6743e-11;
/** Planck's constant, J s (exact). */
export const planckH = 6.62607015e-34;
/** Boltzmann's constant, J/K (exact). */
export const boltzmannK = 1.380649e-23;
/** Stefan–Boltzmann constant, W m⁻² K⁻⁴ (exact: 2π⁵k⁴/15h³c²). */
export const stefanBoltzmann = (2 * Math.PI ** 5 * boltzmannK ** 4) / (15 * planckH ** 3 * speedOfLight ** 2);
/** Proton mass, kg (CODATA 2018). */
export const protonMass = 1.67262192369e-27;
/** Thomson cross-section, m² (CODATA 2018). */
export const thomsonCrossSection = 6.6524587321e-29;
/** Nominal solar mass parameter GM, m³/s² (IAU 2015 resolution B3). */
export const solarMassParameter = 1.3271244e20;
/** Astronomical unit, m (IAU 2012 resolution B2, exact). */
export const astronomicalUnit = 149_597_870_700;

/** Mass in kg of so many nominal solar masses. */
export function solarMassesToKg(massSolar: number): number {
  return (massSolar * solarMassParameter) / newtonG;
}

/** GM/c² in metres: the unit of length, half a Schwarzschild radius. */
export function gravitationalRadius(massSolar: number): number {
  return (massSolar * solarMassParameter) / speedOfLight ** 2;
}

/** GM/c³ in seconds: the unit of time. */
export function gravitationalTime(massSolar: number): number {
  return (massSolar * solarMassParameter) / speedOfLight ** 3;
}

/** A length in M as kilometres. */
export function lengthInKm(massSolar: number, lengthM: number): number {
  return (lengthM * gravitationalRadius(massSolar)) / 1000;
}

/** A length in M as astronomical units. */
export function lengthInAu(massSolar: number, lengthM: number): number {
  return (lengthM * gravitationalRadius(massSolar)) / astronomicalUnit;
}

/** A time in M as seconds. */
export function timeInSeconds(massSolar: number, timeM: number): number {
  return timeM * gravitationalTime(massSolar);
}

/** A time in seconds as M. */
export function timeInM(massSolar: number, seconds: number): number {
  return seconds / gravitationalTime(massSolar);
}

/** An acceleration in 1/M as m/s²: c⁴/(GM). */
export function accelerationInSi(massSolar: number, accelerationPerM: number): number {
  return (accelerationPerM * speedOfLight ** 2) / gravitationalRadius(massSolar);
}
