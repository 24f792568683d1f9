import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  angularVelocity,
  cameraAt,
  clockRate,
  properAcceleration,
  properAccelerationInSi,
  tidalStretch,
} from "@/render/spacetime/clocks";
import { fallTime } from "@/render/spacetime/fall";
import { frameDragging, lapse, metric } from "@/render/spacetime/kerr";
import { createCamera } from "@/render/spacetime/observers";
import { circularOmega, outerHorizon } from "@/render/spacetime/orbits";
import { between, seeded, spins } from "../paths/random-rays";

const place = (...given: Parameters<typeof cameraAt>) => {
  const at = cameraAt(...given);
  if (at.reached !== "place") throw new Error("the camera reached the horizon");
  return at;
};

describe("steady cameras", () => {
  it("turn with their orbit, with the frames, or not at all", () => {
    const [a, r] = [0.9, 8];
    const orbit = createCamera("circular-orbit", a, r, 0);
    expect(angularVelocity(orbit)).toBeCloseTo(circularOmega(a, r, "prograde"), 14);
    expect(place("circular-orbit", a, r, 0, "prograde", 5).phi).toBeCloseTo(
      (5 / clockRate(orbit)) * circularOmega(a, r, "prograde"),
      13,
    );
    const drifting = place("zero-angular-momentum", a, r, 0.4, "prograde", 7);
    expect(drifting.phi / drifting.t).toBeCloseTo(frameDragging(a, r, 0.4), 14);
    expect(place("held", a, r, 0.4, "prograde", 7).phi).toBe(0);
  });

  it("turn backwards in a retrograde orbit", () => {
    expect(place("circular-orbit", 0.5, 12, 0, "retrograde", 3).phi).toBeLessThan(0);
  });
});

describe("the falling camera", () => {
  it("takes (√2/3)(r₀^{3/2} − r^{3/2}) at a = 0 (Misner, Thorne & Wheeler 1973 eq. 25.38, from memory)", () => {
    const tau = (Math.SQRT2 / 3) * (10 ** 1.5 - 5 ** 1.5);
    expect(place("falling", 0, 10, 0.3, "prograde", tau).radius).toBeCloseTo(5, 11);
    expect(fallTime(0, 10, 0.3)).toBeCloseTo((Math.SQRT2 / 3) * (10 ** 1.5 - 2 ** 1.5), 11);
  });

  it("takes the coordinate time of the same fall in Schwarzschild's own closed form", () => {
    const time = (r: number) => {
      const x = Math.sqrt(r / 2);
      return (2 * x ** 3) / 3 + 2 * x + Math.log((x - 1) / (x + 1));
    };
    const tau = (Math.SQRT2 / 3) * (10 ** 1.5 - 3 ** 1.5);
    expect(place("falling", 0, 10, 0, "prograde", tau).t).toBeCloseTo(2 * (time(10) - time(3)), 9);
  });

  it("moves at the velocity its frame says: differences of its path against dr/dτ, dφ/dτ, dt/dτ", () => {
    fc.assert(
      fc.property(spins, between(2, 30), between(-0.95, 0.95), (a, above, cosTheta) => {
        const r = outerHorizon(a) + above;
        const h = 1e-3;
        const [before, after] = [-h, h].map((tau) => place("falling", a, r, cosTheta, "prograde", tau));
        const camera = createCamera("falling", a, r, cosTheta);
        const g = metric(a, r, cosTheta);
        const speed = (camera.gamma * camera.velocity[0]) / Math.sqrt(g.rr);
        expect((after!.radius - before!.radius) / (2 * h)).toBeCloseTo(speed, 6);
        expect((after!.t - before!.t) / (2 * h)).toBeCloseTo(1 / clockRate(camera), 6);
        expect((after!.phi - before!.phi) / (2 * h)).toBeCloseTo(camera.frameDragging / clockRate(camera), 6);
      }),
      seeded(200),
    );
  });

  it("is where it would be after two halves of its time", () => {
    const whole = place("falling", 0.9, 12, 0.5, "prograde", 12);
    const half = place("falling", 0.9, 12, 0.5, "prograde", 6);
    const rest = place("falling", 0.9, half.radius, 0.5, "prograde", 6);
    expect(rest.radius).toBeCloseTo(whole.radius, 11);
    expect(half.phi + rest.phi).toBeCloseTo(whole.phi, 11);
    expect(half.t + rest.t).toBeCloseTo(whole.t, 10);
  });

  it("says when it reached the horizon rather than where it is beyond", () => {
    const at = cameraAt("falling", 0.9, 6, 0.2, "prograde", 100);
    expect(at).toEqual({ reached: "horizon", properTime: fallTime(0.9, 6, 0.2) });
    const before = place("falling", 0.9, 6, 0.2, "prograde", fallTime(0.9, 6, 0.2) - 1e-6);
    expect(before.radius).toBeGreaterThan(outerHorizon(0.9));
    expect(before.radius).toBeLessThan(outerHorizon(0.9) + 1e-4);
  });
});

describe("what a body in the camera's place feels", () => {
  it("is M/(r²√(1−2/r)) when held at a = 0, and nothing when it moves freely", () => {
    expect(properAcceleration("held", 0, 6, 0)).toBeCloseTo(1 / 36 / Math.sqrt(1 - 2 / 6), 14);
    expect(properAcceleration("falling", 0.9, 6, 0)).toBe(0);
    expect(properAcceleration("circular-orbit", 0.9, 6, 0)).toBe(0);
  });

  it("is the gradient of the logarithm of the clock rate, for both cameras that stay", () => {
    fc.assert(
      fc.property(spins, between(2, 30), between(-0.95, 0.95), (a, above, cosTheta) => {
        const r = 2 + above;
        const g = metric(a, r, cosTheta);
        const theta = Math.acos(cosTheta);
        const potentials = {
          held: (x: number, th: number) => 0.5 * Math.log(-metric(a, x, Math.cos(th)).tt),
          "zero-angular-momentum": (x: number, th: number) => Math.log(lapse(a, x, Math.cos(th))),
        } as const;
        for (const kind of ["held", "zero-angular-momentum"] as const) {
          const f = potentials[kind];
          const h = 1e-5;
          const alongR = (f(r + h, theta) - f(r - h, theta)) / (2 * h);
          const alongTheta = (f(r, theta + h) - f(r, theta - h)) / (2 * h);
          const size = Math.sqrt(alongR ** 2 / g.rr + alongTheta ** 2 / g.thth);
          expect(properAcceleration(kind, a, r, cosTheta)).toBeCloseTo(size, 8);
        }
      }),
      seeded(200),
    );
  });

  it("stretches a 2 m body by one g at the horizon of 4.6·10⁴ solar masses (FIELD §4)", () => {
    expect(tidalStretch(4.6e4, 2, 2) / 9.80665).toBeCloseTo(1, 1);
  });

  it("weighs less for a heavier hole at the same radius in M", () => {
    const ratio =
      properAccelerationInSi(10, "held", 0.5, 8, 0) / properAccelerationInSi(1000, "held", 0.5, 8, 0);
    expect(ratio).toBeCloseTo(100, 9);
  });
});
