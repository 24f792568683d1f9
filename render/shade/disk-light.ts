// The light of the thin disk: how hot each radius is, and what colour and brightness that is once shifted.
import { createThinDisk, temperatureRatio, type ThinDisk } from "../emission/thin-disk";
import type { Disk } from "../scene/setup";
import type { Sense } from "../spacetime/orbits";
import { lookUpBlackBody } from "./black-body-colour";

export interface DiskPlan {
  law: ThinDisk;
  sense: Sense;
  inner: number;
  outer: number;
  peakTemperatureK: number;
  /** Luminance of the hottest radius at rest beside it; what every luminance is divided by. */
  peakLuminance: number;
}

export function planDisk(spin: number, disk: Disk): DiskPlan {
  const law = createThinDisk(spin, disk.sense);
  const peak = new Float64Array(3);
  lookUpBlackBody(disk.peakTemperatureK, peak);
  return {
    law,
    sense: disk.sense,
    inner: disk.innerEdge === "isco" ? law.isco : disk.innerEdge,
    outer: disk.outerEdge,
    peakTemperatureK: disk.peakTemperatureK,
    peakLuminance: peak[1]!,
  };
}

/**
 * Writes the X, Y, Z of the disk's face at a radius (M) seen with shift g, in units in which the hottest radius unshifted
 * has Y = 1: a black body of temperature g·T(r), which carries colour and brightness both (Liouville; PHYSICS §11).
 */
export function diskLight(plan: DiskPlan, radius: number, g: number, out: Float64Array): void {
  const temperature = plan.peakTemperatureK * temperatureRatio(plan.law, radius);
  lookUpBlackBody(g * temperature, out);
  for (let k = 0; k < 3; k++) out[k]! /= plan.peakLuminance;
}
