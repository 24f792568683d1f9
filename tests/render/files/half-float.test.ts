import { describe, expect, it } from "vitest";
import { halfBits } from "@/render/files/half-float";
import { halfValue } from "./read-exr";

describe("half floats", () => {
  it("every one of the 63 488 finite halves comes back as itself", () => {
    for (let bits = 0; bits < 0x10000; bits++)
      if (((bits >> 10) & 31) !== 31) expect(halfBits(halfValue(bits))).toBe(bits);
  });

  it("between two halves the nearer is taken, and the even one from the middle", () => {
    for (let bits = 1; bits < 0x7bff; bits += 37) {
      const [low, high] = [halfValue(bits), halfValue(bits + 1)];
      expect(halfBits(low + 0.49 * (high - low))).toBe(bits);
      expect(halfBits(low + 0.51 * (high - low))).toBe(bits + 1);
      expect(halfBits((low + high) / 2)).toBe(bits % 2 ? bits + 1 : bits);
    }
  });

  it("what is too large becomes infinity, and what is no number stays none", () => {
    expect(halfValue(halfBits(65519))).toBe(65504);
    expect(halfBits(65520)).toBe(0x7c00);
    expect(halfBits(-1e9)).toBe(0xfc00);
    expect(halfValue(halfBits(NaN))).toBeNaN();
  });
});
