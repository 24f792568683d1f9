import { describe, expect, it } from "vitest";
import { daysBetween, sayWaiting } from "@/lib/today/waiting-words";
import { minutesForVersion, minutesForWords } from "@/lib/today/reading-time";

const now = new Date("2031-10-20T09:04:00Z");

describe("how long something has waited", () => {
  it.each([
    ["2031-10-20T07:30:00Z", "since 07:30"],
    ["2031-10-19T23:59:00Z", "since yesterday"],
    ["2031-10-18T10:00:00Z", "two days"],
    ["2031-10-17T10:00:00Z", "three days"],
    ["2031-10-15T10:00:00Z", "since Wednesday"],
    ["2031-10-03T10:00:00Z", "since 3 Oct"],
  ])("%s is said as “%s”", (since, said) => {
    expect(sayWaiting(new Date(since), now, "UTC")).toBe(said);
  });

  it("counts the reader's own days, not the server's", () => {
    const late = new Date("2031-10-19T22:30:00Z");
    expect(daysBetween(late, now, "UTC")).toBe(1);
    expect(daysBetween(late, now, "Europe/Berlin")).toBe(0);
    expect(sayWaiting(late, now, "Europe/Berlin")).toBe("since 00:30");
  });
});

describe("reading time", () => {
  it("is ten minutes and four seconds a frame for a version, and a minute at least for words", () => {
    expect(minutesForVersion(96)).toBe(17);
    expect(minutesForWords("")).toBe(1);
    expect(minutesForWords("word ".repeat(401))).toBe(3);
  });
});
