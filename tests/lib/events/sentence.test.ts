import { describe, expect, it } from "vitest";
import { sentenceOf } from "@/lib/events/sentence";

describe("an event's sentence", () => {
  it("is made of the words that were true when it happened", () => {
    expect(sentenceOf("person.joined", { by: "Odo Ferrand", role: "advisor" })).toContain(
      "Odo Ferrand joined as",
    );
  });

  it("is the kind's own name when this build does not know the kind, inherited names included", () => {
    expect(sentenceOf("comet.seen", {})).toBe("comet.seen.");
    expect(sentenceOf("toString", {})).toBe("toString.");
  });
});
