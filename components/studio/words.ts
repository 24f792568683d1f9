const numerals = [
  "no",
  "one",
  "two",
  "three",
  "four",
  "five",
  "six",
  "seven",
  "eight",
  "nine",
  "ten",
  "eleven",
  "twelve",
];

/** "no people", "one person", "twelve people", "13 people". */
export function countWords(count: number, one: string, many: string): string {
  return `${numerals[count] ?? count} ${count === 1 ? one : many}`;
}

export const capitalise = (sentence: string): string => sentence.charAt(0).toUpperCase() + sentence.slice(1);

export const roleWords: Record<string, string> = {
  artist: "artist",
  advisor: "science advisor",
  producer: "producer",
  client: "client",
};
