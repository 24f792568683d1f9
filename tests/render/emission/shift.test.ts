import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { emittedEnergy, plungingEnergy, receivedEnergy } from "@/render/emission/shift";
import { innerProduct, metric } from "@/render/spacetime/kerr";
import { createCamera, createReceivedPhoton, receivePhoton } from "@/render/spacetime/observers";
import { iscoAngularMomentum, iscoEnergy, iscoRadius } from "@/render/spacetime/orbits";
import { between, seeded } from "../paths/random-rays";

describe("redshift", () => {
  it("has the examples of PHYSICS §9", () => {
    expect(1 / emittedEnergy(0.9, 4, "prograde", 3.5)).toBeCloseTo(1.02104064830298, 13);
    expect(1 / emittedEnergy(0.5, 12, "retrograde", 6)).toBeCloseTo(0.752465088566714, 14);
  });

  it("is √(1−3/r) face-on at a = 0, and √2 against √2/3 edge-on at the innermost orbit (FIELD §4)", () => {
    expect(1 / emittedEnergy(0, 6, "prograde", 0)).toBeCloseTo(Math.SQRT1_2, 14);
    const extreme = 6 / Math.sqrt(1 - 2 / 6);
    expect(1 / emittedEnergy(0, 6, "prograde", extreme)).toBeCloseTo(Math.SQRT2, 12);
    expect(1 / emittedEnergy(0, 6, "prograde", -extreme)).toBeCloseTo(Math.SQRT2 / 3, 12);
  });

  it("is the same seen by the emitter as an orbiting camera: a circular-orbit observer measures emittedEnergy", () => {
    const photon = createReceivedPhoton();
    fc.assert(
      fc.property(between(0, 0.99), between(9, 40), between(-1, 1), between(-1, 1), (a, r, x, y) => {
        receivePhoton(createCamera("circular-orbit", a, r, 0), -1, y, x, photon);
        expect(photon.energyFactor).toBeCloseTo(emittedEnergy(a, r, "prograde", photon.lambda), 9);
      }),
      seeded(300),
    );
  });

  it("is what the camera's frame measures: receivedEnergy and receivePhoton agree", () => {
    const photon = createReceivedPhoton();
    fc.assert(
      fc.property(between(0, 0.99), between(2.5, 40), between(-1, 1), between(-1, 1), (a, r, x, y) => {
        const camera = createCamera("falling", a, r, 0.3);
        receivePhoton(camera, -0.7, y, x, photon);
        fc.pre(Math.abs(photon.energyFactor) < 1e3 && Math.abs(y) > 1e-3);
        expect(receivedEnergy(camera, photon) / photon.energyFactor).toBeCloseTo(1, 7);
      }),
      seeded(300),
    );
  });

  it("goes over without a step from orbiting to plunging matter at the innermost stable orbit", () => {
    const r = iscoRadius(0.7, "prograde");
    const photon = { lambda: 1.2, eta: 9, signPr: 1 };
    expect(plungingEnergy(0.7, r, "prograde", photon)).toBeCloseTo(
      emittedEnergy(0.7, r, "prograde", photon.lambda),
      9,
    );
  });

  it("takes plunging matter to be of unit four-velocity, u^r = −0.0834313580587 at a = 0.9, r = 1.8", () => {
    const [a, r] = [0.9, 1.8];
    const isco = iscoRadius(a, "prograde");
    const ur = -Math.sqrt(2 / (3 * isco)) * (isco / r - 1) ** 1.5;
    expect(ur).toBeCloseTo(-0.0834313580587, 12);
    // The radial part of −p·u is what remains between a photon's two signs of p_r.
    const photon = { lambda: 0, eta: 0 };
    const out = plungingEnergy(a, r, "prograde", { ...photon, signPr: 1 });
    const inwards = plungingEnergy(a, r, "prograde", { ...photon, signPr: -1 });
    const g = metric(a, r, 0);
    const d = r * r - 2 * r + a * a;
    const pr = Math.sqrt((r * r + a * a) ** 2 - d * a * a) / d;
    expect((inwards - out) / (2 * pr)).toBeCloseTo(ur, 12);
    const [energy, angular] = [iscoEnergy(a, "prograde"), iscoAngularMomentum(a, "prograde")];
    const determinant = g.tt * g.phph - g.tphi ** 2;
    const ut = (-energy * g.phph - angular * g.tphi) / determinant;
    const uphi = (angular * g.tt + energy * g.tphi) / determinant;
    expect(innerProduct(g, [ut, ur, 0, uphi], [ut, ur, 0, uphi])).toBeCloseTo(-1, 11);
  });
});
