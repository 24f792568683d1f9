// What a disk must look like, from closed forms and common practice.
import { describe, expect, it } from "vitest";
import { planFrame } from "@/render/shade/frame-plan";
import { sampleFates } from "@/render/shade/path-planes";
import { renderTile } from "@/render/shade/render-tile";
import { tracePlanes } from "@/render/shade/trace-planes";
import { smallSetup, type Changes } from "./small-setup";

function look(changes: Changes) {
  const setup = smallSetup({ picture: { width: 160, height: 120 }, ...changes });
  const plan = planFrame(setup, setup.time.first, "proof", "rec709", null);
  const { width, height } = setup.picture;
  const { rgba } = renderTile(plan, 0, height);
  const luminance = (i: number) =>
    0.2126 * rgba[4 * i]! + 0.7152 * rgba[4 * i + 1]! + 0.0722 * rgba[4 * i + 2]!;
  return { planes: tracePlanes(plan, 0, height), luminance, width, height };
}

const sum = (count: number, value: (i: number) => number) =>
  Array.from({ length: count }, (_, i) => value(i)).reduce((a, b) => a + b, 0);

describe("the disk seen edge-on at spin 0.998", () => {
  const { planes, luminance, width, height } = look({
    hole: { spin: 0.998 },
    camera: { radius: 50, inclinationDeg: 90, lens: { kind: "rectilinear", horizontalFieldDeg: 30 } },
  });
  const isLeft = (i: number) => i % width < width / 2;

  // Common practice; the sides follow from PHYSICS §7: a prograde disk comes toward the camera on the left.
  it("is brighter on the left, the side that turns toward the camera", () => {
    const side = (left: boolean) => sum(width * height, (i) => (isLeft(i) === left ? luminance(i) : 0));
    expect(side(true) / side(false)).toBeGreaterThan(5);
  });

  it("is bluer there: its light is shifted up on the left, down on the right", () => {
    const direct = (left: boolean) =>
      [...planes.shift].filter((_, i) => planes.fate[i] === sampleFates.disk && isLeft(i) === left);
    expect(Math.max(...direct(true))).toBeGreaterThan(1.2);
    expect(Math.max(...direct(false))).toBeLessThan(1);
  });
});

describe("the shadow seen edge-on at spin 0.998", () => {
  // Without a disk the shadow's outline is the critical curve (Bardeen 1973). PHYSICS §7: left edge −2.11, right +7.00 M
  // for a distant camera, and the left edge is the flat one: radius of curvature 30 against 5.3.
  const radius = 2000;
  const { planes, width, height } = look({
    hole: { spin: 0.998 },
    disk: null,
    camera: { radius, inclinationDeg: 90, lens: { kind: "rectilinear", horizontalFieldDeg: 5 } },
    picture: { width: 200, height: 200 },
  });
  const perPixel = (2 * Math.tan((2.5 * Math.PI) / 180) * radius) / width;
  const edges = (y: number) => {
    const row = [...planes.fate.subarray(y * width, (y + 1) * width)];
    const inside = (fate: number) => fate === sampleFates.captured;
    return [row.findIndex(inside), row.findLastIndex(inside) + 1].map((x) => (x - width / 2) * perPixel);
  };

  it("spans −2.11 to +7.00 M, shifted to the right", () => {
    const [left, right] = edges(height / 2);
    expect(Math.abs(left! + 2.11)).toBeLessThan(1.5 * perPixel);
    expect(Math.abs(right! - 7)).toBeLessThan(1.5 * perPixel);
  });

  it("is flattened on the left: three M above the middle that edge has hardly moved, the right one has", () => {
    const [left, right] = edges(height / 2);
    const [leftAbove, rightAbove] = edges(Math.round(height / 2 - 3 / perPixel));
    expect(leftAbove! - left!).toBeLessThan(0.25);
    expect(right! - rightAbove!).toBeGreaterThan(0.6);
  });
});

describe("the disk seen from the axis of a hole at rest", () => {
  const radius = 60;
  const { planes } = look({ hole: { spin: 0 }, camera: { radius, inclinationDeg: 0 } });

  it("is shifted by √(1 − 3/r) of the orbit over √(1 − 2/r) of the held camera, everywhere", () => {
    // PHYSICS §9: with a = 0 and λ = 0 exactly √(1 − 3/r) at infinity.
    const disk = [...planes.fate.keys()].filter((i) => planes.fate[i] === sampleFates.disk);
    expect(disk.length).toBeGreaterThan(1000);
    for (const i of disk) {
      const r = planes.radius[i]!;
      const expected = Math.sqrt(1 - 3 / r) / Math.sqrt(1 - 2 / radius);
      expect(planes.shift[i]! / expected).toBeCloseTo(1, 10);
    }
  });

  it("begins at the innermost stable orbit and ends at its outer edge", () => {
    const radii = [...planes.radius].filter((r) => r > 0);
    expect(Math.min(...radii)).toBeGreaterThanOrEqual(6);
    expect(Math.min(...radii)).toBeLessThan(6.5);
    expect(Math.max(...radii)).toBeLessThanOrEqual(20);
  });

  it("is seen again inside its own inner edge, by light that went round the back", () => {
    const orders = new Set([...planes.order].filter((_, i) => planes.fate[i] === sampleFates.disk));
    expect(orders.has(0)).toBe(true);
    expect(orders.has(1)).toBe(true);
  });
});

describe("a moving camera", () => {
  const sky = (observer: "held" | "falling" | "circular-orbit", yawDeg: number) => {
    const { planes, width, height } = look({
      hole: { spin: 0 },
      disk: null,
      camera: {
        observer,
        radius: 20,
        inclinationDeg: 90,
        yawDeg,
        lens: { kind: "rectilinear", horizontalFieldDeg: 5 },
      },
    });
    return planes.shift[(height / 2) * width + width / 2]!;
  };

  // MTW 33.4 and Einstein 1905: √(1 − 2/r) of height, γ(1 + β cos) of motion, from the observer's energy.
  it("sees the sky it leaves behind redder and the sky ahead bluer", () => {
    const height = 1 / Math.sqrt(1 - 2 / 20);
    expect(sky("held", 180)).toBeCloseTo(height, 3);
    // Falling at √(2/r) away from the sky behind it: 1/(1 + √(2/r)).
    expect(sky("falling", 180)).toBeCloseTo(1 / (1 + Math.sqrt(2 / 20)), 3);
    // On a circular orbit the motion is to +φ, the right; its speed by a held observer is 1/√(r − 2).
    const [beta, gamma] = [1 / Math.sqrt(18), 1 / Math.sqrt(1 - 1 / 18)];
    expect(sky("circular-orbit", 90)).toBeCloseTo(height * Math.sqrt((1 + beta) / (1 - beta)), 3);
    expect(sky("circular-orbit", -90)).toBeCloseTo(height * Math.sqrt((1 - beta) / (1 + beta)), 3);
    expect(gamma).toBeGreaterThan(1);
  });
});
