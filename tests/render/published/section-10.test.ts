// Section 10: lenses. Sources stand in each entry and in each test's name.
import { describe, expect, it } from "vitest";
import { fieldOfFocalLength, lensDirection, pixelSolidAngle } from "@/render/scene/lenses";
import type { Lens } from "@/render/scene/setup";
import { entriesOf, expectWithin, nameOf, numberIn, type Entry } from "./entries";

const degrees = 180 / Math.PI;
const domeLens: Lens = { kind: "dome", fieldDeg: 180, tiltDeg: 0 };

function look(entry: Entry, lens: Lens, width: number, height: number) {
  const out = new Float64Array(3);
  const seen = lensDirection(lens, { width, height }, numberIn(entry, "px"), numberIn(entry, "py"), out);
  const expected = entry.expected as { direction_right_up_forward: number[] };
  // Components are compared on the scale of the unit vector they belong to.
  expected.direction_right_up_forward.forEach((value, i) =>
    expect(Math.abs(out[i]! - value)).toBeLessThanOrEqual(1e-12),
  );
  return { seen, out };
}

function checkDome(entry: Entry) {
  const size = numberIn(entry, "N");
  const expected = entry.expected as { rho: number; theta: number; inside_disc: boolean };
  const { seen, out } = look(entry, domeLens, size, size);
  expect(seen).toBe(expected.inside_disc);
  const theta = Math.atan2(Math.hypot(out[0]!, out[1]!), out[2]!);
  expectWithin(entry, "theta", theta, expected.theta);
  expectWithin(entry, "rho", theta / (Math.PI / 2), expected.rho);
}

function checkDomeSolidAngle(entry: Entry) {
  const size = numberIn(entry, "N");
  const { dOmega } = entry.expected as { dOmega: number[] };
  (entry.inputs.theta_deg as number[]).forEach((theta, i) => {
    const px = size / 2 - 0.5 + ((theta / 90) * size) / 2;
    const raster = { width: size, height: size };
    expectWithin(entry, `${theta}°`, pixelSolidAngle(domeLens, raster, px, size / 2 - 0.5), dOmega[i]!);
  });
}

function checkPanorama(entry: Entry) {
  const [width, height] = [numberIn(entry, "W"), numberIn(entry, "H")];
  const expected = entry.expected as { lon: number; lat: number; pixel_solid_angle_exact: number };
  const { out } = look(entry, { kind: "panorama" }, width, height);
  expectWithin(entry, "longitude", Math.atan2(out[0]!, out[2]!), expected.lon);
  expectWithin(entry, "latitude", Math.atan2(out[1]!, Math.hypot(out[0]!, out[2]!)), expected.lat);
  const [px, py] = [numberIn(entry, "px"), numberIn(entry, "py")];
  const angle = pixelSolidAngle({ kind: "panorama" }, { width, height }, px, py);
  expectWithin(entry, "solid angle", angle, expected.pixel_solid_angle_exact);
}

function checkPinhole(entry: Entry) {
  const lens: Lens = { kind: "rectilinear", horizontalFieldDeg: numberIn(entry, "hfov_deg") };
  const { out } = look(entry, lens, numberIn(entry, "W"), numberIn(entry, "H"));
  const angle = Math.atan2(Math.hypot(out[0]!, out[1]!), out[2]!) * degrees;
  const { angle_from_axis_deg } = entry.expected as { angle_from_axis_deg: number };
  expectWithin(entry, "angle", angle, angle_from_axis_deg);
}

function checkFocalLength(entry: Entry) {
  const { hfov_deg } = entry.expected as { hfov_deg: number[] };
  (entry.inputs.focal_mm as number[]).forEach((focal, i) => {
    const field = fieldOfFocalLength(focal, numberIn(entry, "sensor_width_mm"));
    expectWithin(entry, `${focal} mm`, field, hfov_deg[i]!);
  });
}

const checks: Record<string, (entry: Entry) => void> = {
  dome: checkDome,
  domesolid: checkDomeSolidAngle,
  equirect: checkPanorama,
  pinhole: checkPinhole,
  focal: checkFocalLength,
};

describe("published lenses", () => {
  it.each(entriesOf(10).map((entry) => [nameOf(entry), entry] as const))("%s", (_, entry) => {
    expect.hasAssertions();
    checks[entry.id.split("-")[1]!]!(entry);
  });
});
