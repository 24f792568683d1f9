// Section 7: redshift and the Page–Thorne disk (Cunningham 1975; Page & Thorne 1974).
import { describe, expect, it } from "vitest";
import { emittedEnergy, plungingEnergy, receivedEnergy } from "@/render/emission/shift";
import { createThinDisk, diskFlux, temperatureRatio } from "@/render/emission/thin-disk";
import { tracePath } from "@/render/paths/tracer";
import { createCamera, type Observer } from "@/render/spacetime/observers";
import { circularEnergy, iscoRadius } from "@/render/spacetime/orbits";
import { nodes, weights } from "@/render/spacetime/quadrature";
import { bisect } from "@/render/spacetime/spherical-orbits";
import { checksOf, entriesOf, numberIn, type Entry } from "./entries";

const spin = (entry: Entry) => numberIn(entry, "a");

function shift(entry: Entry) {
  const sense = numberIn(entry, "direction") > 0 ? "prograde" : "retrograde";
  return 1 / emittedEnergy(spin(entry), numberIn(entry, "r_em"), sense, numberIn(entry, "lambda"));
}

/** The first crossing of a ray, its emitter there, and g for each observer at the camera's place. */
function rayShift(entry: Entry) {
  const a = spin(entry);
  const angle = numberIn(entry, "theta_obs_deg");
  const cosTheta = angle === 90 ? 0 : Math.cos((angle * Math.PI) / 180);
  const constants = {
    lambda: numberIn(entry, "lambda"),
    eta: numberIn(entry, "eta"),
    signPr: numberIn(entry, "sign_pr") as 1 | -1,
    signPtheta: numberIn(entry, "sign_ptheta") as 1 | -1,
  };
  const rObs = numberIn(entry, "r_obs");
  const [crossing] = tracePath({ spin: a, rObs, cosThetaObs: cosTheta, ...constants }).crossings;
  const r = crossing!.r;
  const emitted =
    r < iscoRadius(a, "prograde")
      ? plungingEnergy(a, r, "prograde", { ...constants, signPr: crossing!.sign_pr })
      : emittedEnergy(a, r, "prograde", constants.lambda);
  const g = (kind: Observer) => receivedEnergy(createCamera(kind, a, rObs, cosTheta), constants) / emitted;
  return {
    r_em: r,
    "nu_em/E": emitted,
    g_static_observer: g("held"),
    g_ZAMO_observer: g("zero-angular-momentum"),
    g_radial_infaller_observer: g("falling"),
    g_infinity: 1 / emitted,
  };
}

/**
 * The direct image of a ring is a closed curve on a distant screen: at each position angle, the distance from the
 * centre at which the first crossing is at the ring. Its extremes in λ are those of g (Cunningham 1975).
 */
function extremes(entry: Entry) {
  const a = spin(entry);
  const ring = numberIn(entry, "r_em");
  const inclination = (numberIn(entry, "inclination_deg") * Math.PI) / 180;
  const [sinI, cosI] = [Math.sin(inclination), Math.cos(inclination)];

  const firstRadius = (lambda: number, beta: number) => {
    const eta = beta * beta - a * a * cosI * cosI + (lambda * cosI) ** 2 / sinI ** 2;
    const signPtheta = beta < 0 ? -1 : 1;
    const start = { spin: a, rObs: Infinity, cosThetaObs: cosI, lambda, eta, signPr: 1, signPtheta } as const;
    return tracePath(start, { tolerance: 1e-14 }).crossings[0]?.r ?? 0;
  };
  const lambdaAt = (angle: number) => {
    const point = (rho: number) => [-rho * Math.cos(angle) * sinI, rho * Math.sin(angle)] as const;
    const rho = bisect(1e-3, 4 * ring, (distance) => firstRadius(...point(distance)) - ring);
    return point(rho)[0];
  };
  const best = (middle: number, wanted: 1 | -1) => {
    const golden = (Math.sqrt(5) - 1) / 2;
    let [low, high] = [middle - 1.2, middle + 1.2];
    while (high - low > 2e-5) {
      const [left, right] = [high - golden * (high - low), low + golden * (high - low)];
      if (wanted * lambdaAt(left) > wanted * lambdaAt(right)) high = right;
      else low = left;
    }
    return lambdaAt(0.5 * (low + high));
  };
  const most = best(Math.PI, 1);
  const least = best(0, -1);
  return {
    g_max: 1 / emittedEnergy(a, ring, "prograde", most),
    g_min: 1 / emittedEnergy(a, ring, "prograde", least),
    lambda_at_g_max: most,
    lambda_at_g_min: least,
  };
}

/** ∫4πrFE dr from the inner edge outwards, over r = r_isco/q². */
function energyBudget(entry: Entry) {
  const a = spin(entry);
  const disk = createThinDisk(a, "prograde");
  const panels = 200;
  let sum = 0;
  for (let panel = 0; panel < panels; panel++)
    for (let i = 0; i < nodes.length; i++) {
      const q = (panel + nodes[i]!) / panels;
      const r = disk.isco / (q * q);
      const density = 4 * Math.PI * r * diskFlux(disk, r) * circularEnergy(a, r, "prograde");
      sum += (weights[i]! / panels) * density * ((2 * disk.isco) / q ** 3);
    }
  return sum;
}

function peak(entry: Entry) {
  const disk = createThinDisk(spin(entry), "prograde");
  const ratio = (times: number) => temperatureRatio(disk, times * numberIn(entry, "r_isco"));
  return {
    "T/Tmax at r=1.1 r_isco": ratio(1.1),
    "T/Tmax at r=2 r_isco": ratio(2),
    "T/Tmax at r=5 r_isco": ratio(5),
    "T/Tmax at r=20 r_isco": ratio(20),
    r_peak: disk.peakRadius,
    "r_peak/r_isco": disk.peakRadius / disk.isco,
    "F_peak/Mdot": disk.peakFlux,
    F_at_isco: diskFlux(disk, disk.isco),
  };
}

const checks = checksOf(7, {
  extreme: extremes,
  g: shift,
  gray: rayShift,
  ptenergy: energyBudget,
  ptflux: (entry) => diskFlux(createThinDisk(spin(entry), "prograde"), numberIn(entry, "r")),
  ptpeak: peak,
});

describe("published values, section 7", () => {
  it("has all its entries", () => expect(entriesOf(7)).toHaveLength(43));
  for (const { name, run } of checks) it(name, run);
});
