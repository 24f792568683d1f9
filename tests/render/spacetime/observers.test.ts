import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { innerProduct, metric } from "@/render/spacetime/kerr";
import {
  aberrate,
  createCamera,
  createReceivedPhoton,
  directionOfPhoton,
  observerVelocity,
  receivePhoton,
  tetrad,
  type Observer,
} from "@/render/spacetime/observers";
import { ergosurface, outerHorizon, photonOrbit } from "@/render/spacetime/orbits";
import { between, seeded, spins } from "../paths/random-rays";

const kinds: Observer[] = ["held", "zero-angular-momentum", "circular-orbit", "falling"];

/** A camera of each kind wherever that kind can be, off the axis. */
const cameras = fc
  .record({
    kind: fc.constantFrom(...kinds),
    a: spins,
    times: between(1.01, 40),
    cosTheta: between(-0.98, 0.98),
  })
  .map(({ kind, a, times, cosTheta }) => {
    const mu = kind === "circular-orbit" ? 0 : cosTheta;
    const inner =
      kind === "held"
        ? ergosurface(a, mu)
        : kind === "circular-orbit"
          ? photonOrbit(a, "prograde")
          : outerHorizon(a);
    return createCamera(kind, a, inner * times, mu);
  });

const directions = fc
  .tuple(between(-1, 1), between(-1, 1), between(-1, 1))
  .filter((n) => n.every((part) => Math.abs(part) > 1e-3))
  .map((n) => n.map((part) => part / Math.hypot(...n)) as [number, number, number]);

describe("observers' frames", () => {
  it("are orthonormal for every kind of observer", () => {
    fc.assert(
      fc.property(cameras, (camera) => {
        const g = metric(camera.a, camera.radius, camera.cosTheta);
        const legs = tetrad(camera);
        legs.forEach((leg, i) =>
          legs.forEach((other, j) => {
            const expected = i !== j ? 0 : i === 0 ? -1 : 1;
            expect(Math.abs(innerProduct(g, leg, other) - expected)).toBeLessThan(1e-7 * camera.gamma ** 2);
          }),
        );
      }),
      seeded(500),
    );
  });

  it("have the static and the falling velocities of PHYSICS §5", () => {
    const cosTheta = Math.cos(Math.PI / 3);
    const held = createCamera("held", 0.9, 6, cosTheta);
    expect(held.velocity[2]).toBeCloseTo(-0.051868351206, 12);
    expect(held.gamma / held.lapse).toBeCloseTo(1.22303579174, 11);
    const falling = createCamera("falling", 0.9, 6, cosTheta);
    expect(falling.velocity[0]).toBeCloseTo(-0.574164961239, 12);
    expect(falling.gamma / falling.lapse).toBeCloseTo(1.49179231394, 11);
  });

  it("are refused, in words, where they cannot be", () => {
    const refused: [Observer, number, number][] = [
      ["held", 1.9, 0],
      ["zero-angular-momentum", 1.4, 0],
      ["falling", 1.4, 0.5],
      ["circular-orbit", 1.5, 0],
      ["circular-orbit", 8, 0.2],
    ];
    for (const [kind, radius, cosTheta] of refused)
      expect(() => observerVelocity(kind, 0.9, radius, cosTheta)).toThrow(RangeError);
    expect(() => observerVelocity("circular-orbit", 0.9, 3.5, 0, "retrograde")).toThrow(/photon orbit/);
  });
});

describe("the photon received from a direction", () => {
  it("has the λ, η and energy of PHYSICS §6", () => {
    const photon = createReceivedPhoton();
    receivePhoton(
      createCamera("zero-angular-momentum", 0.9, 6, Math.cos(Math.PI / 3)),
      -1,
      0.3,
      -0.4,
      photon,
    );
    expect(photon.lambda).toBeCloseTo(2.26033095292452, 12);
    expect(photon.eta).toBeCloseTo(5.24861121735646, 12);
    expect(1 / photon.energyFactor).toBeCloseTo(0.83393297909087, 13);
    expect([photon.signPr, photon.signPtheta]).toEqual([1, -1]);
  });

  it("is seen again in that direction, from inside the ergosphere too", () => {
    const photon = createReceivedPhoton();
    fc.assert(
      fc.property(cameras, directions, (camera, n) => {
        receivePhoton(camera, ...n, photon);
        fc.pre(Math.abs(photon.energyFactor) < 1e4);
        const seen = directionOfPhoton(camera, photon);
        seen.forEach((part, k) => expect(Math.abs(part - n[k]!)).toBeLessThan(1e-6 * camera.gamma ** 2));
      }),
      seeded(1000),
    );
  });

  it("has p·p = 0 and the energy the tetrad gives", () => {
    const photon = createReceivedPhoton();
    fc.assert(
      fc.property(cameras, directions, (camera, n) => {
        receivePhoton(camera, ...n, photon);
        const [et, er, eth, eph] = tetrad(camera);
        const p = et!.map((part, i) => part - n[0] * er![i]! - n[1] * eth![i]! - n[2] * eph![i]!);
        const g = metric(camera.a, camera.radius, camera.cosTheta);
        const energy = -(g.tt * p[0]! + g.tphi * p[3]!);
        const angular = g.tphi * p[0]! + g.phph * p[3]!;
        fc.pre(Math.abs(energy) > 1e-3);
        expect(photon.energyFactor * energy).toBeCloseTo(1, 6);
        expect(Math.abs(photon.lambda - angular / energy)).toBeLessThan(1e-6 * (1 + Math.abs(photon.lambda)));
        expect(Math.abs(innerProduct(g, p, p))).toBeLessThan(1e-7 * camera.gamma ** 2);
      }),
      seeded(500),
    );
  });

  it("has λ = 0 on the axis and starts in the half-plane looked into, at either pole", () => {
    const photon = createReceivedPhoton();
    for (const [cosTheta, towards, phi] of [
      [1, [-1, 0.2, 0], 0],
      [1, [-1, 0, 0.2], Math.PI / 2],
      [-1, [-1, -0.2, 0], 0],
      [-1, [-1, 0, 0.2], Math.PI / 2],
    ] as const) {
      receivePhoton(createCamera("falling", 0.9, 6, cosTheta), towards[0], towards[1], towards[2], photon);
      expect(photon.lambda).toBe(0);
      expect(photon.phiStart).toBeCloseTo(phi, 14);
      expect(photon.signPtheta).toBe(-cosTheta);
    }
  });

  it("tends to the axis's own photon as the camera nears the axis", () => {
    const [near, on] = [createReceivedPhoton(), createReceivedPhoton()];
    receivePhoton(createCamera("held", 0.9, 6, Math.cos(1e-6)), -1, 0.2, 0.1, near);
    receivePhoton(createCamera("held", 0.9, 6, 1), -1, 0.2, 0.1, on);
    expect(near.lambda).toBeCloseTo(0, 5);
    expect(near.eta).toBeCloseTo(on.eta, 4);
    expect(near.energyFactor).toBeCloseTo(on.energyFactor, 5);
  });
});

describe("aberration", () => {
  it("has the example of PHYSICS §11: 30° ahead at half the speed of light (Einstein 1905)", () => {
    const seen = aberrate(Math.cos(Math.PI / 6), 0.5);
    expect((Math.acos(seen.cosTheta) * 180) / Math.PI).toBeCloseTo(17.587953774, 8);
    expect(seen.doppler).toBeCloseTo(1.65470053838, 11);
  });

  it("is undone by the opposite motion", () => {
    fc.assert(
      fc.property(between(-1, 1), between(-0.99, 0.99), (cosTheta, beta) => {
        const seen = aberrate(cosTheta, beta);
        const back = aberrate(seen.cosTheta, -beta);
        expect(back.cosTheta).toBeCloseTo(cosTheta, 9);
        expect(seen.doppler * back.doppler).toBeCloseTo(1, 9);
      }),
      seeded(300),
    );
  });
});
