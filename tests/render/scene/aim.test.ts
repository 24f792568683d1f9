import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { lensAxes, toObserverFrame } from "@/render/scene/aim";
import { lensDirection } from "@/render/scene/lenses";
import { defaultSetup, type Setup } from "@/render/scene/setup";

const degrees = 180 / Math.PI;
const camera = (change: Partial<Setup["camera"]>) => ({ ...defaultSetup.camera, yawDeg: 0, ...change });

/** Direction in (r, θ, φ) components of a direction in lens axes. */
function aimed(change: Partial<Setup["camera"]>, direction: number[]) {
  const out = new Float64Array(3);
  toObserverFrame(lensAxes(camera(change)), Float64Array.from(direction), out);
  return [...out];
}

const close = (actual: number[], expected: number[]) =>
  actual.forEach((value, i) => expect(value).toBeCloseTo(expected[i]!, 12));

describe("the camera's aim", () => {
  it("starts at the hole with the spin axis up and +φ at the right", () => {
    close(aimed({}, [0, 0, 1]), [-1, 0, 0]);
    close(aimed({}, [0, 1, 0]), [0, -1, 0]);
    close(aimed({}, [1, 0, 0]), [0, 0, 1]);
  });

  it("yaw turns the view right, pitch turns it up, roll leans the camera's up to its right", () => {
    const forward = (yawDeg: number, pitchDeg: number) => aimed({ yawDeg, pitchDeg }, [0, 0, 1]);
    close(forward(90, 0), [0, 0, 1]);
    close(forward(0, 90), [0, -1, 0]);
    close(aimed({ rollDeg: 90 }, [0, 1, 0]), [0, 0, 1]);
    // Yaw first: a pitch after it still raises the view toward the spin axis.
    close(forward(30, 20), [
      -Math.cos(30 / degrees) * Math.cos(20 / degrees),
      -Math.sin(20 / degrees),
      Math.sin(30 / degrees) * Math.cos(20 / degrees),
    ]);
  });

  it("keeps lengths, angles and handedness for every yaw, pitch, roll and tilt", () => {
    const angle = (limit: number) => fc.double({ min: -limit, max: limit, noNaN: true });
    fc.assert(
      fc.property(
        angle(180),
        angle(90),
        angle(180),
        fc.double({ min: 0, max: 45, noNaN: true }),
        (y, p, r, tilt) => {
          const lens = { kind: "dome", fieldDeg: 180, tiltDeg: tilt } as const;
          const axes = lensAxes(camera({ yawDeg: y, pitchDeg: p, rollDeg: r, lens }));
          const row = (i: number) => [axes[3 * i]!, axes[3 * i + 1]!, axes[3 * i + 2]!] as const;
          const [right, up, axis] = [row(0), row(1), row(2)];
          const dot = (a: readonly number[], b: readonly number[]) =>
            a.reduce((sum, x, i) => sum + x * b[i]!, 0);
          for (const v of [right, up, axis]) expect(dot(v, v)).toBeCloseTo(1, 12);
          expect(dot(right, up)).toBeCloseTo(0, 12);
          // (r, θ, φ) is right-handed and so is (right, up, −axis).
          const cross = [
            right[1] * up[2] - right[2] * up[1],
            right[2] * up[0] - right[0] * up[2],
            right[0] * up[1] - right[1] * up[0],
          ];
          expect(dot(cross, axis)).toBeCloseTo(-1, 12);
        },
      ),
      { seed: 14 },
    );
  });
});

describe("a dome", () => {
  const size = 1024;
  const raster = { width: size, height: size };
  const lens = (tiltDeg: number) => ({ kind: "dome", fieldDeg: 180, tiltDeg }) as const;

  /** Direction in (r, θ, φ) components seen at a pixel. */
  function seen(px: number, py: number, change: Partial<Setup["camera"]> = {}, tiltDeg = 0) {
    const out = new Float64Array(3);
    expect(lensDirection(lens(tiltDeg), raster, px, py, out)).toBe(true);
    toObserverFrame(lensAxes(camera({ ...change, lens: lens(tiltDeg) })), out, out);
    return [...out];
  }

  // Front at the bottom, audience right at image right, zenith at the centre: community draft for fulldome (FIELD §2).
  it("shows the front horizon at the bottom, the zenith at the centre, the audience's right at the right", () => {
    const middle = size / 2 - 0.5;
    close(seen(middle, size - 0.5), [-1, 0, 0]);
    close(seen(middle, middle), [0, -1, 0]);
    close(seen(size - 0.5, middle), [0, 0, 1]);
  });

  it("shows what is aimed at 30° up when the camera is pitched 30° down", () => {
    const atThirtyDegrees = middleToFront(60);
    close(seen(size / 2 - 0.5, atThirtyDegrees, { pitchDeg: -30 }), [-1, 0, 0]);
  });

  it("tilted toward the audience's front, has the front nearer its centre", () => {
    close(seen(size / 2 - 0.5, middleToFront(75), {}, 15), [-1, 0, 0]);
  });

  it("sees nothing outside its circle", () => {
    expect(lensDirection(lens(0), raster, 0, 0, new Float64Array(3))).toBe(false);
  });

  const middleToFront = (angleDeg: number) => size / 2 - 0.5 + ((angleDeg / 90) * size) / 2;
});
