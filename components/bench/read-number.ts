/** The number someone wrote: "34", "−0.5", "4.2e7", "1 998". Anything else is not a number, and the field says so. */
export function readNumber(text: unknown): number {
  if (typeof text === "number") return text;
  const plain = String(text)
    .replace("−", "-")
    .replace(/[\s\u202f_]/g, "");
  return plain === "" ? Number.NaN : Number(plain);
}
