import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { canonicalJson } from "@/render/scene/canonical";
import { defaultSetup } from "@/render/scene/setup";

describe("canonical JSON", () => {
  it("writes RFC 8785's own example (section 3.2.4) as that document does", () => {
    const value = {
      numbers: [333333333.33333329, 1e30, 4.5, 2e-3, 0.000000000000000000000000001],
      string: '€$\u000f\nA\'B"\\\\"/',
      literals: [null, true, false],
    };
    expect(canonicalJson(value)).toBe(
      '{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],' +
        '"string":"€$\\u000f\\nA\'B\\"\\\\\\\\\\"/"}',
    );
  });

  it("sorts keys by UTF-16 code units, as RFC 8785 section 3.2.3 asks", () => {
    const keys = ["\u20ac", "\r", "\ufb33", "1", "\u{1f600}", "\u0080", "\u00f6"];
    const value = Object.fromEntries(keys.map((key, i) => [key, i]));
    const sorted = Object.keys(JSON.parse(canonicalJson(value)) as object);
    expect(sorted.filter((key) => key !== "1")).toEqual([
      "\r",
      "\u0080",
      "\u00f6",
      "\u20ac",
      "\u{1f600}",
      "\ufb33",
    ]);
  });

  it("gives every JSON value back, whatever the order of its keys", () => {
    fc.assert(
      fc.property(fc.jsonValue(), (value) => {
        const text = canonicalJson(value);
        expect(canonicalJson(JSON.parse(text))).toBe(text);
        expect(JSON.parse(text)).toEqual(JSON.parse(JSON.stringify(value)));
      }),
      { seed: 8785 },
    );
  });

  it("is the same for two setups whose keys were written in different orders", () => {
    const reversed = Object.fromEntries(Object.entries(defaultSetup).reverse());
    expect(canonicalJson(reversed)).toBe(canonicalJson(defaultSetup));
  });

  it("leaves out undefined members and refuses numbers that JSON cannot hold", () => {
    expect(canonicalJson({ a: undefined, b: -0 })).toBe('{"b":0}');
    expect(() => canonicalJson({ a: NaN })).toThrow("JSON cannot hold NaN.");
    expect(() => canonicalJson([Infinity])).toThrow("JSON cannot hold Infinity.");
    expect(() => canonicalJson({ a: () => 1 })).toThrow("JSON cannot hold a function.");
  });
});
