import { describe, expect, it } from "vitest";
import { frameDigits, frameName } from "@/render/files/frame-names";
import { defaultSetup, type Lens } from "@/render/scene/setup";

const digits = (last: number, lens: Lens = defaultSetup.camera.lens) =>
  frameDigits({ camera: { ...defaultSetup.camera, lens }, time: { ...defaultSetup.time, last } });

describe("frame names", () => {
  it("have four digits for film, five for a dome (common practice), more when the last frame needs them", () => {
    expect(digits(1024)).toBe(4);
    expect(digits(1800, { kind: "dome", fieldDeg: 180, tiltDeg: 0 })).toBe(5);
    expect(digits(123_456)).toBe(6);
  });

  it("sort as text in the order of their numbers", () => {
    const names = [9, 10, 99, 100, 12_000].map((frame) => frameName("dome", frame, digits(12_000), "exr"));
    expect([...names].sort()).toEqual(names);
    expect(names[0]).toBe("dome_00009.exr");
  });

  it("refuse stems that are no plain file name and numbers that do not fit", () => {
    for (const stem of ["../x", "a b", "", ".hidden"])
      expect(() => frameName(stem, 1, 4, "png")).toThrow(RangeError);
    expect(() => frameName("x", 12_345, 4, "png")).toThrow("Frame 12345 does not fit 4 digits.");
  });
});
