// Two methods with no code in common must agree: series in Mino time, and Hamilton's equations in Kerr–Schild space.
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { traceSecondPath } from "@/render/paths/second-path";
import { polarPotential, radialPotential } from "@/render/paths/motion";
import type { PathStart } from "@/render/paths/light-path";
import { tracePath } from "@/render/paths/tracer";
import { createCamera, createReceivedPhoton, receivePhoton } from "@/render/spacetime/observers";
import { foldAngle, photons, seeded } from "./random-rays";

/** The impact parameter's size, √(η+λ²+a²+1): what a path's lengths compare with. */
const scaleOf = ({ lambda, eta, spin }: PathStart) => Math.sqrt(eta + lambda ** 2 + spin ** 2 + 1);

/** λ and η hold a direction to half the digits only, within 10⁻⁸ of one that grazes its circle of r or of θ. */
function grazes(start: PathStart): boolean {
  const { spin, lambda, eta, rObs, cosThetaObs } = start;
  const scale = scaleOf(start);
  const radial = radialPotential(spin, lambda, eta, 1 / rObs) / (1 + (scale / rObs) ** 2);
  const polar = polarPotential(spin, lambda, eta, cosThetaObs) / scale ** 2;
  return radial < 1e-3 || (polar < 1e-3 && Math.abs(cosThetaObs) < 1);
}

function expectSame(start: PathStart): void {
  const path = tracePath(start, { tolerance: 1e-13 });
  const other = traceSecondPath(start);
  expect(other.fate).toBe(path.fate);
  expect(other.crossings).toHaveLength(path.equatorial_crossings_total);
  path.crossings.forEach(({ r, dphi, dt }, k) => {
    const same = other.crossings[k]!;
    // A crossing far out moves in proportion to how far: its 1/r is what is known.
    const far = 1 + r / scaleOf(start);
    expect(Math.abs(same.r / r - 1)).toBeLessThan(1e-7 * far);
    expect(Math.abs(foldAngle(same.dphiMod2pi - dphi))).toBeLessThan(1e-7);
    expect(Math.abs(same.dt - dt)).toBeLessThan(1e-7 * (1 + dt) * far);
  });
  if (path.fate !== "escaped") return;
  expect(Math.abs(other.cosThetaInf! - path.cos_theta_inf!)).toBeLessThan(1e-7);
  const sinInf = Math.sqrt(1 - path.cos_theta_inf! ** 2);
  expect(Math.abs(foldAngle(other.dphiInfMod2pi! - path.dphi_inf!)) * sinInf).toBeLessThan(1e-7);
}

describe("a second opinion", () => {
  it("agrees on fifty seeded rays: fate, every listed crossing's place and time, and the direction far away", () => {
    const rays = photons(1.01).filter((start) => !grazes(start));
    fc.assert(fc.property(rays, expectSame), seeded(50));
  });

  it("agrees on light of negative energy from inside the ergosphere", () => {
    const photon = createReceivedPhoton();
    receivePhoton(createCamera("zero-angular-momentum", 0.998, 1.3, 0.02), -0.1, 0.1, 0.95, photon);
    expect(photon.energyFactor).toBeLessThan(0);
    const start = { spin: 0.998, rObs: 1.3, cosThetaObs: 0.02, ...photon };
    const { fate, crossings } = tracePath(start);
    expect(fate).toBe("captured");
    expect(crossings[0]!.dt).toBeGreaterThan(0);
    expectSame(start);
  });

  it("says so when there is no such photon", () => {
    const start = {
      spin: 0.5,
      rObs: 10,
      cosThetaObs: 0.5,
      lambda: 1,
      eta: -50,
      signPr: 1,
      signPtheta: 1,
    } as const;
    expect(traceSecondPath(start)).toEqual({ fate: "unresolved", crossings: [] });
  });
});
