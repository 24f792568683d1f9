// Second pass along a light path: azimuth and delay at the events the first pass found.
import { addSpan, clearSums } from "./delays";
import { fates, type PathRecord } from "./light-path";
import { azimuthOfOrbit } from "./polar-azimuth";
import { slopeAt, valueAt } from "./polynomials";
import { stride, type PathWork } from "./path-work";
import { terms } from "./series";

/** Fills in φ and t, only as far as a listed crossing or an escape needs them. */
export function addAzimuthAndTime(record: PathRecord, withTime: boolean): void {
  const { work } = record;
  const { motion, series, span } = work;
  const { lambda, eta, scale, energySign } = motion;
  const turnSign = lambda < 0 ? -1 : 1;
  const onAxis = Math.abs(series[terms]!) === 1;
  const begun = onAxis ? Math.PI : azimuthOfOrbit(lambda, series[terms]!, scale * series[terms + 1]!);
  const lastStep =
    record.fate === fates.escaped ? record.steps - 1 : work.crossingStep[record.crossingCount - 1]!;
  clearSums(work);

  let crossing = 0;
  for (let step = 0; step <= lastStep; step++) {
    const at = step * stride;
    span[0] = 0;
    if (crossing < record.crossingCount && work.crossingStep[crossing] === step) {
      const s = work.crossingAt[crossing]!;
      span[1] = s;
      addSpan(work, at, withTime);
      const turned = eta > 0 ? Math.PI * (crossing + 1) - begun : 0;
      record.dphi[crossing] = -energySign * (work.azimuth[0]! + turnSign * turned);
      record.dt[crossing] = withTime ? energySign * delayAt(work, at, s) : 0;
      record.axisBefore[crossing] = lambda === 0 ? Math.round(turned / Math.PI) : 0;
      crossing++;
      span[0] = s;
    }
    if (step === lastStep && record.fate !== fates.escaped) return;
    span[1] = work.length[step]!;
    addSpan(work, at, withTime && crossing < record.crossingCount);
  }

  const at = lastStep * stride + terms;
  const end = work.length[lastStep]!;
  const mu = Math.min(1, Math.max(-1, valueAt(series, at, end)));
  const since = azimuthOfOrbit(lambda, mu, scale * slopeAt(series, at, end));
  const turned = eta > 0 ? Math.PI * record.crossingsTotal + since - begun : 0;
  record.cosThetaInf = mu;
  record.dphiInf = -energySign * (work.azimuth[0]! + turnSign * turned);
  record.axisPassages = lambda === 0 ? Math.round(turned / Math.PI) : 0;
}

/** The delay at an event: the running integral, and what its closed forms give between the observer and here. */
function delayAt({ motion, series, delay, ratio }: PathWork, at: number, s: number): number {
  const here = slopeAt(series, at, s) / valueAt(series, at, s);
  const there = series[1]! / series[0]!;
  return delay[0]! + 2 * Math.log(ratio[0]!) + motion.scale * (there - here);
}
