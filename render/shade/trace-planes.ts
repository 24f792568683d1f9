// Every sample of some rows: pixel → direction → constants of motion → light path → what the picture needs of it.
import { emittedEnergy } from "../emission/shift";
import {
  createPathRecord,
  fates,
  listedCrossings,
  type PathRecord,
  type PathStart,
} from "../paths/light-path";
import { traceInto } from "../paths/tracer";
import { toObserverFrame } from "../scene/aim";
import { lensDirection } from "../scene/lenses";
import { createReceivedPhoton, receivePhoton, type ReceivedPhoton } from "../spacetime/observers";
import type { FramePlan } from "./frame-plan";
import { createPlanes, sampleFates, type PathPlanes } from "./path-planes";

/** Traces rows y0 to y1 (exclusive) of the frame, `samples`² light paths a pixel. */
export function tracePlanes(plan: FramePlan, y0: number, y1: number): PathPlanes {
  const { setup, samples, camera, axes } = plan;
  const { lens } = setup.camera;
  const planes = createPlanes(setup.picture.width * samples, (y1 - y0) * samples);
  const direction = new Float64Array(3);
  const photon = createReceivedPhoton();
  const record = createPathRecord();
  const start: PathStart = {
    spin: setup.hole.spin,
    rObs: camera.observer.radius,
    cosThetaObs: camera.observer.cosTheta,
    lambda: 0,
    eta: 0,
    signPr: 1,
    signPtheta: 1,
  };
  const options = { withTime: false, stopInner: plan.disk?.inner, stopOuter: plan.disk?.outer };

  for (let i = 0, row = 0; row < planes.rows; row++) {
    const py = y0 + (row + 0.5) / samples - 0.5;
    for (let column = 0; column < planes.width; column++, i++) {
      const px = (column + 0.5) / samples - 0.5;
      if (!lensDirection(lens, setup.picture, px, py, direction)) {
        planes.fate[i] = sampleFates.outsideLens;
        continue;
      }
      toObserverFrame(axes, direction, direction);
      receivePhoton(camera.observer, direction[0]!, direction[1]!, direction[2]!, photon);
      start.lambda = photon.lambda;
      start.eta = photon.eta;
      start.signPr = photon.signPr;
      start.signPtheta = photon.signPtheta;
      traceInto(start, record, options);
      notePath(plan, record, photon, planes, i);
    }
  }
  return planes;
}

/**
 * Writes what became of one path into the planes. With (−p·u_obs)/E known of the photon, the shift is that alone for light
 * from the sky, at rest far away, and that over (−p·u_em)/E for light from the disk.
 */
function notePath(
  { setup, disk, camera }: FramePlan,
  record: PathRecord,
  photon: ReceivedPhoton,
  planes: PathPlanes,
  i: number,
): void {
  const last = record.crossingsTotal - 1;
  if (record.fate === fates.stopped && last < listedCrossings) {
    const radius = record.r[last]!;
    planes.fate[i] = sampleFates.disk;
    planes.order[i] = last;
    planes.radius[i] = radius;
    planes.shift[i] =
      photon.energyFactor / emittedEnergy(setup.hole.spin, radius, disk!.sense, photon.lambda);
  } else if (record.fate === fates.escaped) {
    const sinTheta = Math.sqrt((1 - record.cosThetaInf) * (1 + record.cosThetaInf));
    const phi = camera.phi + photon.phiStart + record.dphiInf;
    planes.fate[i] = sampleFates.sky;
    planes.shift[i] = photon.energyFactor;
    planes.sky[3 * i] = sinTheta * Math.cos(phi);
    planes.sky[3 * i + 1] = sinTheta * Math.sin(phi);
    planes.sky[3 * i + 2] = record.cosThetaInf;
  } else {
    // A fourth or later image of the disk, thinner than exp(−3π) of the first, is left black with the hole.
    planes.fate[i] = record.fate === fates.unresolved ? sampleFates.unresolved : sampleFates.captured;
  }
}
