import { describe, expect, it } from "vitest";
import { sayConsequences } from "@/components/bench/consequences";
import { figures, sayLength, sayTime, scientific } from "@/components/bench/quantities";
import { readNumber } from "@/components/bench/read-number";
import { defaultSetup, type Setup } from "@/render/scene/setup";

describe("quantities", () => {
  it.each([
    [34, "34.0"],
    [0.395, "0.395"],
    [0.0312, "0.0312"],
    [152_345, "152,000"],
    [1, "1.00"],
    [0, "0.00"],
    [4.2e7, "4.20 × 10⁷"],
    [3.3e-5, "3.30 × 10⁻⁵"],
  ])("say %s as %s", (value, said) => {
    expect(figures(value)).toBe(said);
  });

  it("choose the unit a person would", () => {
    expect(sayTime(197)).toBe("3.28 min");
    expect(sayTime(4.925e-5)).toBe("49.3 µs");
    expect(sayTime(6.4e7)).toBe("2.03 years");
    expect(sayLength(44.3)).toBe("44.3 km");
    expect(sayLength(6.2e7)).toBe("62.0 million km");
    expect(sayLength(2.11e9)).toBe("14.1 au");
    expect(scientific(1.234e-12)).toBe("1.23 × 10⁻¹²");
  });

  it("are read as people write them, and nonsense is no number", () => {
    expect(["34", "4.2e7", "−0.5", "1 998"].map(readNumber)).toEqual([34, 4.2e7, -0.5, 1998]);
    expect(["", "3,5", "ten", "1.2.3"].map(readNumber).every(Number.isNaN)).toBe(true);
  });
});

describe("what follows from a setup", () => {
  const withParts = (parts: Partial<Setup>): Setup => ({ ...defaultSetup, ...parts });

  // Bardeen, Press & Teukolsky 1972, as FIELD §4 lists them: a = 0.9 horizon 1.4359, prograde ISCO 2.3209.
  it("states the published radii", () => {
    const said = sayConsequences(withParts({ hole: { massSolar: 4e7, spin: 0.9 } }));
    expect(said.spin).toContain("horizon at 1.436 M");
    expect(said.innerEdge).toContain("innermost stable orbit 2.321 M");
  });

  // FIELD §4: a clock held at 10 M beside a hole without spin runs at √(1 − 2/10) = 0.8944.
  it("states the camera's clock", () => {
    const camera = { ...defaultSetup.camera, radius: 10 };
    expect(sayConsequences(withParts({ hole: { massSolar: 4e7, spin: 0 }, camera })).radius).toContain(
      "clock 0.894",
    );
  });

  // FIELD §4: the orbital period at a = 0 on the innermost stable orbit is 92.34 M, 12.6 h for 10⁸ suns;
  // peak temperature at a tenth of the Eddington rate 7.0 × 10⁴ K.
  it("states the period and the temperature that FIELD lists for 10⁸ suns", () => {
    const said = sayConsequences(withParts({ hole: { massSolar: 1e8, spin: 0 } }));
    expect(said.innerEdge).toContain("one orbit 12.6 h");
    expect(Number(/disk: ([\d,]+) K/.exec(said.peakTemperature)?.[1]?.replace(",", ""))).toBeCloseTo(7e4, -3);
  });

  it("says nothing where there is nothing to say, and never a broken number", () => {
    const bare = sayConsequences(withParts({ disk: null }));
    expect([bare.outerEdge, bare.accretion, bare.turns]).toEqual(["", "", ""]);
    const camera = { ...defaultSetup.camera, radius: Number.NaN };
    const broken = sayConsequences(withParts({ camera, hole: { massSolar: Number.NaN, spin: 2 } }));
    expect(Object.values(broken).join(" ")).not.toMatch(/NaN|Infinity|undefined/);
    const inside = sayConsequences(withParts({ camera: { ...defaultSetup.camera, radius: 1.1 } }));
    expect(inside.radius).toBe("");
  });
});
