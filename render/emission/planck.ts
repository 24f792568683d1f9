// Black-body radiation in SI units. Symbols follow Rybicki & Lightman (1979), section 1.5.
import { boltzmannK, planckH, speedOfLight, stefanBoltzmann } from "../units";

/** c₂ = hc/k in m K. Tables older than 2019 use 1.4388e-2 or 1.435e-2. */
export const secondRadiationConstant = (planckH * speedOfLight) / boltzmannK;

/**
 * Spectral radiance by frequency, B_ν(T) = 2hν³/c² / (exp(hν/kT) − 1) (Planck 1901), in W m⁻² Hz⁻¹ sr⁻¹.
 * Frequency in Hz and temperature in K, both positive. A black body seen with shift g is one of temperature gT:
 * g³ B_{ν/g}(T) = B_ν(gT), so shift either the spectrum or the temperature, never both.
 */
export function planckByFrequency(frequencyHz: number, temperatureK: number): number {
  const exponent = (planckH * frequencyHz) / (boltzmannK * temperatureK);
  return (2 * planckH * frequencyHz ** 3) / speedOfLight ** 2 / Math.expm1(exponent);
}

/**
 * Spectral radiance by wavelength, B_λ(T) = 2hc²/λ⁵ / (exp(c₂/λT) − 1) (Planck 1901), in W m⁻² m⁻¹ sr⁻¹.
 * Wavelength in m and temperature in K, both positive; c₂ in m K, today's unless an older table is reproduced.
 */
export function planckByWavelength(
  wavelengthM: number,
  temperatureK: number,
  c2 = secondRadiationConstant,
): number {
  return (2 * planckH * speedOfLight ** 2) / wavelengthM ** 5 / Math.expm1(c2 / (wavelengthM * temperatureK));
}

/** Radiance of a black body over all frequencies, σT⁴/π, in W m⁻² sr⁻¹; its flux is π times that. */
export function blackBodyRadiance(temperatureK: number): number {
  return (stefanBoltzmann * temperatureK ** 4) / Math.PI;
}
