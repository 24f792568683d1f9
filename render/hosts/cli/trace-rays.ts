// Rays in, light paths out, in the field names of the published check values, section 6.
import { createPathRecord, fates, type PathRecord } from "../../paths/light-path";
import { traceInto } from "../../paths/tracer";
import type { Ray } from "./ray-schema";

const degrees = 180 / Math.PI;
// A hundred times tighter than a picture needs; a path costs a third more.
const pipelineTolerance = 1e-13;
const fateNames = { [fates.captured]: "captured", [fates.escaped]: "escaped" } as Record<number, string>;

/** One object a ray, in the rays' order: the ray's id, if it has one, then what became of it. */
export function traceRays(rays: readonly Ray[]): object[] {
  const record = createPathRecord();
  return rays.map((ray) => {
    const start = {
      spin: ray.a,
      rObs: ray.r_obs,
      cosThetaObs: ray.cos_theta_obs,
      lambda: ray.lambda,
      eta: ray.eta,
      signPr: ray.sign_pr_at_observer,
      signPtheta: ray.sign_ptheta_at_observer,
    };
    traceInto(start, record, { tolerance: pipelineTolerance });
    const onAxis = Math.abs(ray.cos_theta_obs) === 1;
    return { ...(ray.id !== undefined && { id: ray.id }), ...describe(record, onAxis) };
  });
}

function describe(record: PathRecord, onAxis: boolean): object {
  const azimuth = (name: string, value: number) =>
    onAxis ? { [`${name}_mod_2pi`]: withinHalfTurn(value) } : { [name]: value };
  const crossings = Array.from({ length: record.crossingCount }, (_, i) => ({
    r: record.r[i],
    ...azimuth("dphi", record.dphi[i]!),
    ...(onAxis && { axis_passages: record.axisBefore[i] }),
    dt: record.dt[i],
    sign_pr: record.signPr[i],
    sign_ptheta: record.signPtheta[i],
  }));
  return {
    fate: fateNames[record.fate] ?? "unresolved",
    equatorial_crossings_total: record.crossingsTotal,
    crossings,
    ...(record.fate === fates.escaped && {
      theta_inf_deg: Math.acos(record.cosThetaInf) * degrees,
      cos_theta_inf: record.cosThetaInf,
      ...azimuth("dphi_inf", record.dphiInf),
      ...(onAxis && { axis_passages_total: record.axisPassages }),
    }),
    ...(record.rTurningPoint > 0 && { r_turning_point: record.rTurningPoint }),
  };
}

/** The same angle in (−π, π]. */
const withinHalfTurn = (angle: number) => angle - 2 * Math.PI * Math.ceil(angle / (2 * Math.PI) - 0.5);
