import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { createPathRecord, fates, type PathRecord, type PathStart } from "@/render/paths/light-path";
import { traceInto, tracePath } from "@/render/paths/tracer";
import { outerHorizon } from "@/render/spacetime/orbits";
import { foldAngle, photons, seeded } from "./random-rays";

const record = createPathRecord();

/** Everything a record says, without what an earlier path left beyond the listed crossings. */
const listed = ({ crossingCount, r, dphi, dt, cosThetaInf, dphiInf, steps, fate }: PathRecord) => ({
  crossings: [r, dphi, dt].map((values) => [...values.subarray(0, crossingCount)]),
  far: [cosThetaInf, dphiInf, steps, fate],
});

describe("worked example of PHYSICS §3", () => {
  const start: PathStart = {
    spin: 0.9,
    rObs: 1000,
    cosThetaObs: 0.5,
    lambda: -2,
    eta: 20,
    signPr: 1,
    signPtheta: 1,
  };

  it("meets the equator at r = 2.64980326922503 with the azimuth and delay given there, then is captured", () => {
    const path = tracePath(start);
    expect(path.fate).toBe("captured");
    expect(path.crossings[0]!.r).toBeCloseTo(2.64980326922503, 11);
    expect(path.crossings[0]!.dphi).toBeCloseTo(2.41311185059506, 11);
    expect(path.crossings[0]!.dt).toBeCloseTo(1018.6117404991, 8);
  });
});

describe("every path", () => {
  it("has an outcome, and no number in it that is not finite", () => {
    fc.assert(
      fc.property(photons(), (start) => {
        traceInto(start, record);
        const { r, dphi, dt, cosThetaInf, dphiInf, rTurningPoint, residual } = record;
        for (const value of [...r, ...dphi, ...dt, cosThetaInf, dphiInf, rTurningPoint, residual])
          expect(Number.isFinite(value)).toBe(true);
        expect([fates.captured, fates.escaped]).toContain(record.fate);
      }),
      seeded(3000),
    );
  });

  it("keeps its invariants u'² = U and μ'² = M", () => {
    fc.assert(
      fc.property(photons(), (start) => {
        traceInto(start, record);
        expect(record.residual).toBeLessThan(1e-8);
      }),
      seeded(2000),
    );
  });

  it("crosses the equator outside the horizon, later and later into the past", () => {
    fc.assert(
      fc.property(photons(), (start) => {
        traceInto(start, record);
        let before = 0;
        for (let k = 0; k < record.crossingCount; k++) {
          expect(record.r[k]!).toBeGreaterThan(outerHorizon(start.spin));
          expect(record.dt[k]!).toBeGreaterThan(before);
          before = record.dt[k]!;
        }
      }),
      seeded(2000),
    );
  });

  it("changes hemisphere once per crossing, for northern and southern cameras alike", () => {
    fc.assert(
      fc.property(photons(), (start) => {
        traceInto(start, record);
        fc.pre(record.fate === fates.escaped && Math.abs(start.cosThetaObs) > 1e-9);
        const stays = record.crossingsTotal % 2 === 0;
        expect(record.cosThetaInf * start.cosThetaObs > 0).toBe(stays);
      }),
      seeded(2000),
    );
  });

  it("alternates between upward and downward crossings", () => {
    fc.assert(
      fc.property(photons(), (start) => {
        traceInto(start, record);
        for (let k = 1; k < record.crossingCount; k++)
          expect(record.signPtheta[k]).toBe(-record.signPtheta[k - 1]!);
      }),
      seeded(1000),
    );
  });

  it("is mirrored by the equatorial plane", () => {
    fc.assert(
      fc.property(photons(), (start) => {
        const path = tracePath(start);
        const signPtheta = start.signPtheta === 1 ? -1 : 1;
        const mirror = tracePath({ ...start, cosThetaObs: -start.cosThetaObs, signPtheta });
        expect(mirror.fate).toBe(path.fate);
        expect(mirror.crossings.map(({ r, dphi, dt }) => [r, dphi, dt])).toEqual(
          path.crossings.map(({ r, dphi, dt }) => [r, dphi, dt]),
        );
        if (path.fate === "escaped") expect(Math.abs(mirror.cos_theta_inf! + path.cos_theta_inf!)).toBe(0);
      }),
      seeded(1000),
    );
  });

  it("is mirrored by turning λ and φ round at a = 0, where nothing tells them apart", () => {
    fc.assert(
      fc.property(photons(), (given) => {
        // The camera's own λ may be no path of a hole without spin; η takes up the difference.
        const start = { ...given, spin: 0, eta: Math.abs(given.eta), rObs: given.rObs + 2 };
        const path = tracePath(start);
        fc.pre(path.fate !== "unresolved" && start.lambda !== 0);
        const mirror = tracePath({ ...start, lambda: -start.lambda });
        expect(mirror.crossings.map(({ r, dt }) => [r, dt])).toEqual(
          path.crossings.map(({ r, dt }) => [r, dt]),
        );
        path.crossings.forEach(({ dphi }, k) => expect(Math.abs(mirror.crossings[k]!.dphi + dphi)).toBe(0));
      }),
      seeded(1000),
    );
  });
});

describe("a path taken up again at one of its crossings", () => {
  it("goes on as it did: azimuth and delay add up", () => {
    fc.assert(
      fc.property(photons(1.5), (start) => {
        const whole = tracePath(start, { tolerance: 1e-13 });
        fc.pre(whole.crossings.length >= 2 && start.lambda !== 0);
        const [first, second] = [whole.crossings[0]!, whole.crossings[1]!];
        const rest = tracePath(
          {
            ...start,
            rObs: first.r,
            cosThetaObs: 0,
            signPr: first.sign_pr as 1 | -1,
            signPtheta: first.sign_ptheta as 1 | -1,
          },
          { tolerance: 1e-13 },
        );
        // A path that all but circles the hole forgets where it began: differences grow by e^π each half-orbit.
        fc.pre(rest.crossings.length >= 1 && second.r < 1e4);
        const again = rest.crossings[0]!;
        expect(Math.abs(again.r / second.r - 1)).toBeLessThan(1e-6);
        expect(Math.abs(first.dphi + again.dphi - second.dphi)).toBeLessThan(1e-6);
        expect(Math.abs(first.dt + again.dt - second.dt)).toBeLessThan(1e-6 * (1 + second.dt));
      }),
      seeded(2000),
    );
  });
});

describe("limits", () => {
  it("is a straight line far from the hole: deflection 4/b and no more at b = 10⁵ (Einstein 1915)", () => {
    const b = 1e5;
    const path = tracePath({
      spin: 0.7,
      rObs: Infinity,
      cosThetaObs: 0,
      lambda: b,
      eta: 0,
      signPr: 1,
      signPtheta: 1,
    });
    expect(Math.abs(path.dphi_inf!) - Math.PI).toBeCloseTo(4 / b, 8);
  });

  it("comes back to Schwarzschild's path as the spin goes to zero", () => {
    const start = { rObs: 40, cosThetaObs: 0.3, lambda: 3, eta: 25, signPr: 1, signPtheta: -1 } as const;
    const still = tracePath({ ...start, spin: 0 });
    const slow = tracePath({ ...start, spin: 1e-9 });
    expect(slow.fate).toBe(still.fate);
    expect(slow.cos_theta_inf).toBeCloseTo(still.cos_theta_inf!, 7);
    slow.crossings.forEach(({ r, dphi, dt }, k) => {
      expect(r / still.crossings[k]!.r).toBeCloseTo(1, 7);
      expect(dphi).toBeCloseTo(still.crossings[k]!.dphi, 7);
      expect(dt).toBeCloseTo(still.crossings[k]!.dt, 5);
    });
  });

  it("stays in one plane at a = 0: crossings are half a turn apart whatever the tilt", () => {
    const start = {
      spin: 0,
      rObs: 50,
      cosThetaObs: 0.4,
      lambda: 2,
      eta: 23.5,
      signPr: 1,
      signPtheta: 1,
    } as const;
    const { crossings } = tracePath(start);
    expect(crossings.length).toBeGreaterThanOrEqual(2);
    expect(crossings[1]!.dphi - crossings[0]!.dphi).toBeCloseTo(-Math.PI, 12);
  });

  it("is continuous across λ = 0, where the azimuth at the pole jumps by half a turn", () => {
    const start = { spin: 0.6, rObs: 30, cosThetaObs: 0.5, eta: 40, signPr: 1, signPtheta: -1 } as const;
    const [through, beside] = [0, 1e-9].map((lambda) => tracePath({ ...start, lambda }));
    expect(foldAngle(through!.dphi_inf! - beside!.dphi_inf!)).toBeCloseTo(0, 6);
    expect(through!.cos_theta_inf).toBeCloseTo(beside!.cos_theta_inf!, 7);
  });
});

describe("options", () => {
  const start: PathStart = {
    spin: 0.9,
    rObs: 50,
    cosThetaObs: 0.2,
    lambda: 2,
    eta: 27,
    signPr: 1,
    signPtheta: -1,
  };

  it("stops at the first crossing inside an opaque disk, and gives it the same numbers", () => {
    const whole = tracePath(start);
    const reached = whole.crossings[1]!;
    const stopped = tracePath(start, { stopInner: reached.r * 0.99, stopOuter: reached.r * 1.01 });
    expect(stopped.fate).toBe("stopped");
    expect(stopped.equatorial_crossings_total).toBe(2);
    expect(stopped.crossings[1]).toEqual(reached);
  });

  it("stops at the crossing of a given number", () => {
    const stopped = tracePath(start, { stopAfterCrossings: 1 });
    expect(stopped.fate).toBe("stopped");
    expect(stopped.crossings).toEqual([tracePath(start).crossings[0]]);
  });

  it("leaves out the delay and nothing else when time is not wanted", () => {
    const [timed, untimed] = [tracePath(start), tracePath(start, { withTime: false })];
    expect(untimed.crossings.map(({ dt }) => dt)).toEqual(timed.crossings.map(() => 0));
    expect(untimed.crossings.map(({ r, dphi }) => [r, dphi])).toEqual(
      timed.crossings.map(({ r, dphi }) => [r, dphi]),
    );
  });

  it("gives a record used before the same answer as a fresh one", () => {
    const used = createPathRecord();
    traceInto({ ...start, lambda: -5, eta: 3 }, used);
    traceInto(start, used);
    const fresh = createPathRecord();
    traceInto(start, fresh);
    expect(listed(used)).toEqual(listed(fresh));
  });
});

describe("bugs found by random rays", () => {
  it("divides nothing by an underflown a², where a and λ are subnormal and η is zero", () => {
    const start = { spin: 5e-324, rObs: 2.002, cosThetaObs: 0, lambda: 1e-320, eta: 0 };
    traceInto({ ...start, signPr: -1, signPtheta: 1 }, record);
    expect(record.fate).toBe(fates.escaped);
    expect(record.dphiInf).toBeCloseTo(0, 12);
  });
});

describe("what cannot be traced", () => {
  const start: PathStart = {
    spin: 0.5,
    rObs: 10,
    cosThetaObs: 0.5,
    lambda: 1,
    eta: 20,
    signPr: 1,
    signPtheta: 1,
  };
  const impossible: [string, Partial<PathStart>][] = [
    ["a camera in the horizon", { rObs: 1.5 }],
    ["a number that is not one", { lambda: NaN }],
    ["constants no photon has here", { eta: -50 }],
    ["more angular momentum than can come so near", { lambda: 1e6 }],
    ["an infinite constant", { eta: Infinity }],
  ];
  for (const [what, change] of impossible)
    it(`ends unresolved for ${what}, with every number finite`, () => {
      traceInto({ ...start, ...change }, record);
      expect(record.fate).toBe(fates.unresolved);
      expect(record.crossingCount).toBe(0);
      expect([record.residual, record.dphiInf, record.cosThetaInf].every(Number.isFinite)).toBe(true);
    });
});
