import { describe, expect, it } from "vitest";
import { cameraAtFrame, horizonFrame, properTime } from "@/render/scene/camera";
import { setupSchema } from "@/render/scene/setup";
import { smallSetup } from "../shade/small-setup";

// A hole whose GM/c³ is a second: 203 025 solar masses (PHYSICS: 4.925491 µs a solar mass).
const second = 1 / 4.925491e-6;
const film = { rate: { numerator: 24, denominator: 1 }, first: 1001, last: 1024 };

describe("the camera's clock", () => {
  it("starts at the first frame and runs with the frame rate, whatever the rational", () => {
    const ntsc = { rate: { numerator: 24000, denominator: 1001 }, first: 10, last: 20 };
    const hole = { massSolar: second, spin: 0.5 };
    expect(properTime({ hole, time: film }, 1001)).toBe(0);
    expect(properTime({ hole, time: film }, 1025)).toBeCloseTo(1, 6);
    expect(properTime({ hole, time: ntsc }, 34)).toBeCloseTo(1.001, 6);
  });
});

describe("the camera at a frame", () => {
  const hole = { massSolar: second / 10, spin: 0 };
  const at = (observer: "held" | "circular-orbit" | "falling", frame: number) =>
    cameraAtFrame(
      smallSetup({ hole, time: film, camera: { observer, radius: 10, inclinationDeg: 90 } }),
      frame,
    );

  it("stays when held", () => {
    const { observer, phi } = at("held", 1024);
    expect([observer.radius, phi]).toEqual([10, 0]);
  });

  it("turns in φ on a circular orbit, by dφ/dτ = 1/(r √(r − 3)) of its own time (MTW 25.6, from memory)", () => {
    expect(at("circular-orbit", 1024).phi).toBeCloseTo((10 * 23) / 24 / (10 * Math.sqrt(7)), 5);
    expect(at("circular-orbit", 1001).phi).toBe(0);
  });

  it("falls from rest at infinity: r^{3/2} falls by (3/2)√2 of its own time (MTW 31.2, from memory)", () => {
    const fallen = 10 ** 1.5 - 1.5 * Math.SQRT2 * ((10 * 23) / 24);
    expect(at("falling", 1024).observer.radius).toBeCloseTo(fallen ** (2 / 3), 4);
  });
});

describe("a falling camera that reaches the horizon", () => {
  const setup = smallSetup({
    hole: { massSolar: second / 10, spin: 0 },
    camera: { observer: "falling", radius: 10, inclinationDeg: 90 },
    time: film,
  });

  it("does so at the first frame after τ = (√2/3)(r^{3/2} − 2^{3/2})", () => {
    // 13.574 M of 0.1 s are 1.3574 s: 32.58 frames.
    expect(horizonFrame(setup)).toBe(1001 + 33);
    expect(() => cameraAtFrame(setup, 1033)).not.toThrow();
    expect(() => cameraAtFrame(setup, 1034)).toThrow("in the horizon at frame 1034");
  });

  it("is refused by the setup's schema when that frame is in its range, which the message names", () => {
    const until = (last: number) => setupSchema.safeParse({ ...setup, time: { ...film, last } });
    expect(until(1033).success).toBe(true);
    const refused = until(1034);
    expect(refused.error!.issues).toMatchObject([
      {
        path: ["time", "last"],
        message:
          "The falling camera reaches the horizon at frame 1034. End before that frame, or begin farther out.",
      },
    ]);
  });
});
