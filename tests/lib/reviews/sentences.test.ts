import { describe, expect, it } from "vitest";
import { describeMass, describeSetup } from "@/lib/reviews/describe-setup";
import { composeDeclaration, composeWithdrawal } from "@/lib/reviews/schema-declaration";
import { composeReceipt } from "@/lib/deliveries/schema-receipt";
import { defaultSetup } from "@/render/scene/setup";

const digest = "7c1e90ab".repeat(8);
const said = {
  advisor: "Imke",
  production: "Lodestar",
  shotCode: "LH-020",
  number: 4,
  maker: "Tavi",
  digest,
  first: 1001,
  last: 1096,
};

describe("the declaration's sentences", () => {
  it("say who looked at which frames of which digest, and what they declare in which words", () => {
    expect(composeDeclaration({ ...said, kind: "signed off", words: "As physics has it." })).toBe(
      `I, Imke, science advisor to Lodestar, have looked at frames 1001 to 1096 of version 4 of LH-020, made by Tavi, and at no other bytes than those of the digest ${digest}.\n\n` +
        "On these frames I declare: signed off. They may be delivered with the science note as it stands.\n\n" +
        "In these words: “As physics has it.”",
    );
    expect(composeDeclaration({ ...said, last: 1001, kind: "returned", words: "Why." })).toContain(
      "have looked at frame 1001 of version 4",
    );
  });

  it("say what is withdrawn and why", () => {
    expect(composeWithdrawal({ ...said, words: "An edge." })).toMatch(
      /withdraw the sign-off of frames 1001 to 1096 .* taken\.\n\nFor this reason: “An edge\.”$/,
    );
  });

  it("say what a client received, or refuses", () => {
    const receipt = {
      client: "Odile",
      number: 2,
      title: "Reel one",
      files: 212,
      manifestDigest: digest,
      words: "",
    };
    expect(composeReceipt({ ...receipt, kind: "received" })).toBe(
      `I, Odile, have received 212 files of delivery 2, Reel one, each as it was signed, under the manifest digest ${digest}.`,
    );
    expect(composeReceipt({ ...receipt, kind: "refused", words: "Torn." })).toMatch(
      /^I, Odile, refuse delivery 2.*For this reason: “Torn\.”$/s,
    );
  });
});

describe("a setup in sentences", () => {
  it("names every choice with its unit", () => {
    expect(describeSetup(defaultSetup)).toEqual([
      "The hole has the mass of 40 million suns and spin 0.6 of at most 1.",
      "The camera is held still at 30 M from it, 80° from the spin axis, aimed at the hole. Its lens is rectilinear, 50° wide.",
      // The innermost stable orbit at spin 0.6 by Bardeen, Press and Teukolsky 1972, eq. 2.21.
      "The disk reaches from the innermost stable orbit, 3.829 M, to 20 M, turns with the hole, and is 9,000 K at its hottest, as its gas sees it.",
      "The sky holds the catalogued stars, as bright as catalogued.",
      "The picture is 1998 × 1080 at 24 frames a second, exposed by 0 stops.",
    ]);
  });

  it("says a mass in suns, in words for millions and more", () => {
    expect([10, 4e6, 6.5e9].map(describeMass)).toEqual([
      "10 suns",
      "4 million suns",
      "6.5 thousand million suns",
    ]);
  });
});
