// Section 9: black bodies, their colours, and the colour spaces. Sources stand in each entry and in each test's name.
import { describe, expect, it } from "vitest";
import {
  blackBodyRadiance,
  planckByFrequency,
  planckByWavelength,
  secondRadiationConstant,
} from "@/render/emission/planck";
import { stefanBoltzmann } from "@/render/units";
import { sumBlackBody, type SumRule } from "@/render/shade/black-body-colour";
import { apply, invert, primaries, rgbToRgb, rgbToXyz } from "@/render/shade/colour-spaces";
import { encodeSrgb } from "@/render/shade/transfer";
import { entriesOf, expectWithin, nameOf, numberIn, type Entry } from "./entries";

const numbers = (value: unknown) => value as Record<string, number>;
const list = (value: unknown) => value as number[];

function chromaticity(temperature: number, rule?: SumRule) {
  const [x, y, z] = sumBlackBody(temperature, rule);
  return { x: x / (x + y + z), y: y / (x + y + z) };
}

function expectMatrix(entry: Entry, actual: readonly (readonly number[])[]) {
  (entry.expected as number[][]).forEach((row, i) =>
    row.forEach((value, j) => expectWithin(entry, `[${i}][${j}]`, actual[i]![j]!, value)),
  );
}

/** Where a positive function is largest: bisection on its logarithmic slope, a six-point difference. */
function peakOf(f: (x: number) => number, low: number, high: number): number {
  const h = 0.01;
  const slope = (logX: number) => {
    const at = (k: number) => Math.log(f(Math.exp(logX + k * h)));
    return (at(3) - at(-3)) / 60 - (3 * (at(2) - at(-2))) / 20 + (3 * (at(1) - at(-1))) / 4;
  };
  let [a, b] = [Math.log(low), Math.log(high)];
  for (let i = 0; i < 60; i++) {
    const middle = (a + b) / 2;
    if (slope(middle) > 0) a = middle;
    else b = middle;
  }
  return Math.exp((a + b) / 2);
}

function checkChromaticity(entry: Entry) {
  const expected = entry.expected as { x: number; y: number; linear_rec709: number[] };
  const temperature = numberIn(entry, "T");
  const { x, y } = chromaticity(temperature, { c2: numberIn(entry, "c2") });
  expectWithin(entry, "x", x, expected.x);
  expectWithin(entry, "y", y, expected.y);

  // The entry's own words: "RGB tolerance rel 2e-3".
  const [X, Y, Z] = sumBlackBody(temperature);
  const rgb = apply(invert(rgbToXyz(primaries.rec709)), [X / Y, 1, Z / Y]);
  expected.linear_rec709.forEach((value, i) =>
    expect(Math.abs(rgb[i]! - value)).toBeLessThanOrEqual(2e-3 * Math.abs(value)),
  );
}

function checkIlluminantA(entry: Entry) {
  const { x, y } = chromaticity(numberIn(entry, "T"), { c2: numberIn(entry, "c2") });
  expectWithin(entry, "x", x, numbers(entry.expected).x!);
  expectWithin(entry, "y", y, numbers(entry.expected).y!);
}

function checkFiveNanometreSum(entry: Entry) {
  const [firstNm, lastNm] = list(entry.inputs.range_nm);
  const rule = { c2: numberIn(entry, "c2"), stepNm: numberIn(entry, "step_nm"), firstNm, lastNm };
  const { x, y } = chromaticity(numberIn(entry, "T"), rule);
  expectWithin(entry, "x", x, numbers(entry.expected).x!);
  expectWithin(entry, "y", y, numbers(entry.expected).y!);
}

function checkRenamedTemperature(entry: Entry) {
  const [c2, T] = [numberIn(entry, "c2_old"), numberIn(entry, "T_old")];
  expectWithin(entry, "1.4388e-2", (T * 1.4388e-2) / c2, numbers(entry.expected)["T_1.4388e-2"]!);
  expectWithin(entry, "SI", (T * secondRadiationConstant) / c2, numbers(entry.expected).T_SI2019!);
}

function checkShiftedBody(entry: Entry) {
  const [g, T, nu] = [numberIn(entry, "g"), numberIn(entry, "T_em"), numberIn(entry, "nu_obs")];
  const expected = numbers(entry.expected);
  expectWithin(entry, "shifted spectrum", g ** 3 * planckByFrequency(nu / g, T), expected.I_nu_obs!);
  expectWithin(entry, "shifted temperature", planckByFrequency(nu, g * T), expected.I_nu_obs!);
  expectWithin(entry, "temperature", g * T, expected.T_obs!);
  expectWithin(
    entry,
    "bolometric",
    blackBodyRadiance(g * T) / blackBodyRadiance(T),
    expected.bolometric_ratio!,
  );
  expectWithin(entry, "without g³", planckByFrequency(nu / g, T), expected.B_nu_wrong_without_g3!);
}

function checkReferenceBody(entry: Entry) {
  const T = numberIn(entry, "T");
  const expected = numbers(entry.expected);
  expectWithin(entry, "flux", stefanBoltzmann * T ** 4, expected.sigmaT4!);
  expectWithin(entry, "radiance", blackBodyRadiance(T), expected.radiance!);
  const longest = peakOf((wavelength) => planckByWavelength(wavelength, T), 1e-8, 1e-5);
  expectWithin(entry, "peak wavelength", longest, expected.lambda_peak_m!);
  const highest = peakOf((frequency) => planckByFrequency(frequency, T), 1e13, 1e16);
  expectWithin(entry, "peak frequency", highest, expected.nu_peak_Hz!);
}

function checkEncoding(entry: Entry) {
  const { encoded, code8 } = entry.expected as { encoded: number[]; code8: number[] };
  list(entry.inputs.linear).forEach((linear, i) => {
    expectWithin(entry, String(linear), encodeSrgb(linear), encoded[i]!);
    expect(Math.round(255 * encodeSrgb(linear))).toBe(code8[i]);
  });
}

function checkOldList(entry: Entry) {
  const { x, y } = entry.expected as { x: number[]; y: number[] };
  list(entry.inputs.T).forEach((T, i) => {
    expectWithin(entry, `x at ${T} K`, chromaticity(T).x, x[i]!);
    expectWithin(entry, `y at ${T} K`, chromaticity(T).y, y[i]!);
  });
}

const checks: Record<string, (entry: Entry) => void> = {
  "709ap1": (entry) => expectMatrix(entry, rgbToRgb(primaries.rec709, primaries.acescg)),
  ap0: (entry) => expectMatrix(entry, rgbToXyz(primaries.ap0)),
  ap1: (entry) => expectMatrix(entry, rgbToXyz(primaries.acescg)),
  m709: (entry) => expectMatrix(entry, rgbToXyz(primaries.rec709)),
  dopplerbb: checkShiftedBody,
  illumA: checkIlluminantA,
  illumAT: checkRenamedTemperature,
  planck5nm: checkFiveNanometreSum,
  planckxy: checkChromaticity,
  srgbtf: checkEncoding,
  table87: checkOldList,
  wien: checkReferenceBody,
};

describe("published colour", () => {
  it.each(entriesOf(9).map((entry) => [nameOf(entry), entry] as const))("%s", (_, entry) => {
    expect.hasAssertions();
    checks[entry.id.split("-")[1]!]!(entry);
  });
});
