// The colour of a black body of any temperature: summed once into a table, read by every pixel.
import { planckByWavelength, secondRadiationConstant } from "../emission/planck";
import { cieX, cieY, cieZ, firstWavelengthNm } from "./cie-1931";
import type { Triple } from "./colour-spaces";

export interface SumRule {
  c2?: number;
  stepNm?: number;
  firstNm?: number;
  lastNm?: number;
}

/**
 * Tristimulus values of a black body, X = Σ x̄(λ) B_λ(T) Δλ and so on (CIE 15:2018, 7.1), in W m⁻² sr⁻¹ (times 683 lm/W
 * Y is luminance in cd/m²). Temperature in K, positive. The rule's defaults are the full table: 360–830 nm by 1 nm.
 */
export function sumBlackBody(temperatureK: number, rule: SumRule = {}): Triple {
  const { c2 = secondRadiationConstant, stepNm = 1, firstNm = firstWavelengthNm, lastNm = 830 } = rule;
  let [x, y, z] = [0, 0, 0];
  for (let nm = firstNm; nm <= lastNm; nm += stepNm) {
    const i = nm - firstWavelengthNm;
    const radiance = planckByWavelength(nm * 1e-9, temperatureK, c2) * stepNm * 1e-9;
    x += (cieX[i] ?? 0) * radiance;
    y += (cieY[i] ?? 0) * radiance;
    z += (cieZ[i] ?? 0) * radiance;
  }
  return [x, y, z];
}

// Colder than the first entry shines 1e50 times less than the coldest disk that can be asked for: black.
const coldestK = 200;
const hottestK = 1e8;
const logStep = 0.02;
const logColdest = Math.log(coldestK);
const entries = Math.ceil((Math.log(hottestK) - logColdest) / logStep) + 3;

let table: Float64Array | undefined;

/** ln X, ln Y, ln Z by equal steps of ln T, beginning one step below the coldest temperature. */
function logTable(): Float64Array {
  if (table) return table;
  table = new Float64Array(3 * entries);
  for (let i = 0; i < entries; i++)
    table.set(sumBlackBody(Math.exp(logColdest + (i - 1) * logStep)).map(Math.log), 3 * i);
  return table;
}

/**
 * The same tristimulus values by cubic interpolation of their logarithms (Lagrange, four points); relative error below
 * 1e-6. Writes X, Y, Z into `out`. Zero below 200 K; above 1e8 K they grow as T (Rayleigh–Jeans).
 */
export function lookUpBlackBody(temperatureK: number, out: Float64Array): void {
  if (!(temperatureK >= coldestK)) {
    out.fill(0, 0, 3);
    return;
  }
  const values = logTable();
  const clamped = Math.min(temperatureK, hottestK);
  const position = (Math.log(clamped) - logColdest) / logStep + 1;
  const i = Math.min(Math.floor(position), entries - 3);
  const f = position - i;

  const w0 = (-f * (f - 1) * (f - 2)) / 6;
  const w1 = ((f + 1) * (f - 1) * (f - 2)) / 2;
  const w2 = (-(f + 1) * f * (f - 2)) / 2;
  const w3 = ((f + 1) * f * (f - 1)) / 6;
  const scale = temperatureK / clamped;
  for (let k = 0; k < 3; k++) {
    const at = 3 * (i - 1) + k;
    const logValue = w0 * values[at]! + w1 * values[at + 3]! + w2 * values[at + 6]! + w3 * values[at + 9]!;
    out[k] = scale * Math.exp(logValue);
  }
}
