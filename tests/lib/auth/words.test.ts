import { describe, expect, it } from "vitest";
import { clientAddress } from "@/lib/auth/client-address";
import { wordsOfWait } from "@/lib/auth/wait";

describe("a wait in words", () => {
  it.each([
    [1, "1 second"],
    [1001, "2 seconds"],
    [59_000, "59 seconds"],
    [60_000, "1 minute"],
    [60_001, "2 minutes"],
    [15 * 60_000, "15 minutes"],
  ])("is never shorter than %d ms: %s", (milliseconds, words) => {
    expect(wordsOfWait(milliseconds)).toBe(words);
  });
});

describe("the address tries are counted by", () => {
  it("is what the nearest proxy saw, whatever the client wrote before it", () => {
    expect(clientAddress(new Headers({ "x-forwarded-for": "198.51.100.1, 203.0.113.9" }))).toBe(
      "203.0.113.9",
    );
    expect(clientAddress({ "x-forwarded-for": "203.0.113.9" })).toBe("203.0.113.9");
  });

  it("is one shared name when nothing was noted", () => {
    expect(clientAddress(undefined)).toBe("unknown");
    expect(clientAddress(new Headers())).toBe("unknown");
  });
});
