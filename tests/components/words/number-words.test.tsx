import { describe, expect, it } from "vitest";
import { sayHeadline, sayMinutes } from "@/components/today/headline";
import { countOf, listNames, numberWords } from "@/components/words/number-words";

describe("numbers as a sentence says them", () => {
  it.each([
    [0, "no"],
    [1, "one"],
    [13, "thirteen"],
    [20, "twenty"],
    [21, "twenty-one"],
    [96, "ninety-six"],
    [100, "100"],
    [1920, "1,920"],
  ])("%d is %s", (value, words) => {
    expect(numberWords(value)).toBe(words);
  });

  it("count things, and list people, as one would", () => {
    expect([countOf(1, "shot", "shots"), countOf(2, "shot", "shots")]).toEqual(["one shot", "two shots"]);
    expect([[], ["Ilo"], ["Ilo", "Ada"], ["Ilo", "Ada", "Corin"]].map(listNames)).toEqual([
      "",
      "Ilo",
      "Ilo and Ada",
      "Ilo, Ada and Corin",
    ]);
  });

  it.each([
    [1, "one minute"],
    [12, "twelve minutes"],
    [33, "thirty-five minutes"],
    [52, "fifty minutes"],
    [60, "an hour"],
    [75, "one and a half hours"],
    [125, "two hours"],
  ])("%d minutes are %s", (minutes, words) => {
    expect(sayMinutes(minutes)).toBe(words);
  });
});

describe("the headline of Today", () => {
  it("counts what waits and how long reading it takes", () => {
    expect(sayHeadline([{ minutes: 17 }, { minutes: 28 }, { minutes: 5 }])).toBe(
      "Three things wait for you, about fifty minutes.",
    );
    expect(sayHeadline([{ minutes: 1 }])).toBe("One thing waits for you, about one minute.");
  });

  it("says no time when one of them cannot be reckoned, and that nothing waits when nothing does", () => {
    expect(sayHeadline([{ minutes: 17 }, { minutes: null }])).toBe("Two things wait for you.");
    expect(sayHeadline([])).toBe("Nothing waits for you.");
  });
});
