import { describe, expect, it } from "vitest";
import { setupFromJson } from "@/render/scene/parse-setup";
import { defaultSetup } from "@/render/scene/setup";

const problemsOf = (value: unknown) => {
  const parsed = setupFromJson(typeof value === "string" ? value : JSON.stringify(value));
  return parsed.ok ? [] : parsed.problems;
};

describe("a setup read from text", () => {
  it("comes back as it was written", () => {
    expect(setupFromJson(JSON.stringify(defaultSetup))).toEqual({ ok: true, value: defaultSetup });
  });

  it("says that a text is not JSON", () => {
    expect(problemsOf("{")).toHaveLength(1);
    expect(problemsOf("{")[0]).toMatch(/^This is not JSON: /);
  });

  it("names the place of each wrong value and the range it should be in", () => {
    const wrong = structuredClone(defaultSetup);
    wrong.hole.spin = 1.2;
    wrong.camera.lens = { kind: "dome", fieldDeg: 90, tiltDeg: 0 };
    expect(problemsOf(wrong)).toEqual([
      "hole.spin: Must be between 0 and 0.9999.",
      "camera.lens.fieldDeg: Must be between 180 and 220°.",
      "picture.height: A dome frame is square: height must equal width.",
    ]);
  });

  it("names a part that is missing and a part that is unknown", () => {
    const { hole, ...rest } = defaultSetup;
    expect(problemsOf(rest)[0]).toMatch(/^hole: /);
    expect(problemsOf({ ...rest, hole: { ...hole, charge: 1 } })[0]).toMatch(/^hole: .*charge/);
  });
});
