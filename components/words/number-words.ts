// Small whole numbers as a sentence says them.
const small =
  "no one two three four five six seven eight nine ten eleven twelve thirteen fourteen fifteen sixteen seventeen eighteen nineteen".split(
    " ",
  );
const tens = "twenty thirty forty fifty sixty seventy eighty ninety".split(" ");

/** "three", "fifty", "twenty-one"; figures from a hundred on. */
export function numberWords(value: number): string {
  if (!Number.isInteger(value) || value < 0 || value > 99) return value.toLocaleString("en");
  if (value < 20) return small[value]!;
  const ten = tens[Math.floor(value / 10) - 2]!;
  return value % 10 === 0 ? ten : `${ten}-${small[value % 10]}`;
}

export const capitalised = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);

/** "one thing", "three things". */
export const countOf = (value: number, one: string, many: string): string =>
  `${numberWords(value)} ${value === 1 ? one : many}`;

/** "Ilo", "Ilo and Corin", "Ilo, Ada and Corin". */
export const listNames = (names: readonly string[]): string =>
  names.length > 1 ? `${names.slice(0, -1).join(", ")} and ${names.at(-1)}` : (names[0] ?? "");
