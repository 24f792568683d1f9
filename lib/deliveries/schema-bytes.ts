// Lengths in the units the trade counts in: powers of ten, to three figures.
const units = [
  [1e12, "TB"],
  [1e9, "GB"],
  [1e6, "MB"],
  [1e3, "kB"],
] as const;

/** The unit a length is best told in. */
export const unitFor = (bytes: number): { size: number; name: string } => {
  const [size, name] = units.find(([least]) => bytes >= least) ?? [1, "bytes"];
  return { size, name };
};

/** A length's figure in a unit, without it: "72.4". */
export const figureIn = (bytes: number, size: number): string => {
  const value = bytes / size;
  return size === 1 ? String(bytes) : value.toFixed(value < 9.995 ? 2 : value < 99.95 ? 1 : 0);
};

/** "72.4 GB", "512 bytes". */
export function sayBytes(bytes: number): string {
  const { size, name } = unitFor(bytes);
  return `${figureIn(bytes, size)} ${bytes === 1 ? "byte" : name}`;
}
