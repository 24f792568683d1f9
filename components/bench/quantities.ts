// Quantities as they stand in the slip: to three figures, in the unit a person would choose.

/** Three significant figures unless told otherwise, thousands parted by commas: "1,540", "0.395", "34.0". */
export function figures(value: number, digits = 3): string {
  if (value !== 0 && (Math.abs(value) >= 1e6 || Math.abs(value) < 1e-4)) return scientific(value, digits);
  const rounded = Number(value.toPrecision(digits));
  const leading = Math.floor(Math.log10(Math.abs(rounded) || 1)) + 1;
  const places = Math.max(0, digits - leading);
  return rounded.toLocaleString("en", { minimumFractionDigits: places, maximumFractionDigits: places });
}

const raised = "⁰¹²³⁴⁵⁶⁷⁸⁹";

/** "4.00 × 10⁷". */
export function scientific(value: number, digits = 3): string {
  const [mantissa, exponent] = value.toExponential(digits - 1).split("e") as [string, string];
  const power = String(Math.abs(Number(exponent))).replace(/\d/g, (digit) => raised[Number(digit)] ?? "");
  return `${mantissa} × 10${Number(exponent) < 0 ? "⁻" : ""}${power}`;
}

const times = [
  [31_557_600, "years"],
  [86_400, "days"],
  [3600, "h"],
  [60, "min"],
  [1, "s"],
  [1e-3, "ms"],
] as const;

/** "3.28 min", "19.2 h", "49.3 µs". */
export function sayTime(seconds: number): string {
  const [size, unit] = times.find(([least]) => seconds >= least) ?? [1e-6, "µs"];
  return `${figures(seconds / size)} ${unit}`;
}

const kmPerAu = 149_597_870.7;

/** "44.3 km", "62.0 million km", "14.1 au". */
export function sayLength(km: number): string {
  if (km >= 0.5 * kmPerAu) return `${figures(km / kmPerAu)} au`;
  if (km >= 1e6) return `${figures(km / 1e6)} million km`;
  return `${figures(km)} km`;
}

const standardGravity = 9.80665;

/** An acceleration in m/s² as "130 g". */
export const sayGravity = (acceleration: number): string => `${figures(acceleration / standardGravity)} g`;
