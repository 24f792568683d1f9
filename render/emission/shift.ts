// The redshift g = ν_obs/ν_em = (p·u_obs)/(p·u_em) (Cunningham 1975, ApJ 202, 788; Luminet 1979 for a = 0).
// Energies are per unit of the photon's energy at infinity E, and are negative with it. Units G = c = M = 1.
import { radialPotential } from "../paths/motion";
import { delta } from "../spacetime/kerr";
import { zamoMomentum, type Camera, type ReceivedPhoton } from "../spacetime/observers";
import {
  circularBracket,
  iscoAngularMomentum,
  iscoEnergy,
  iscoRadius,
  senseSign,
  type Sense,
} from "../spacetime/orbits";

/**
 * (−p·u)/E of a photon of given λ at a circular equatorial emitter:
 * [1 ± r^{−3/2}(a − λ)]/√(1 − 3/r ± 2a r^{−3/2}) (Bardeen, Press & Teukolsky 1972). Domain r > r_ph, else NaN.
 */
export function emittedEnergy(a: number, r: number, sense: Sense, lambda: number): number {
  const rate = senseSign(sense) / (r * Math.sqrt(r));
  return (1 + rate * (a - lambda)) / Math.sqrt(circularBracket(a, r, sense));
}

/**
 * (−p·u)/E at matter that left the innermost stable orbit with its energy and angular momentum and now plunges:
 * u^r = −√(2/(3r_isco)) (r_isco/r − 1)^{3/2} (Cunningham 1975). η and the sign of p_r matter here as well as λ.
 * Domain r₊ < r ≤ r_isco.
 */
export function plungingEnergy(
  a: number,
  r: number,
  sense: Sense,
  photon: { lambda: number; eta: number; signPr: number },
): number {
  const isco = iscoRadius(a, sense);
  const energy = iscoEnergy(a, sense);
  const angular = iscoAngularMomentum(a, sense);
  const d = delta(a, r);
  const ut = ((r * r + a * a + (2 * a * a) / r) * energy - ((2 * a) / r) * angular) / d;
  const uphi = ((1 - 2 / r) * angular + ((2 * a) / r) * energy) / d;
  const inwards = Math.max(0, isco / r - 1);
  const ur = -Math.sqrt(2 / (3 * isco)) * inwards * Math.sqrt(inwards);
  const potential = Math.max(0, radialPotential(a, photon.lambda, photon.eta, 1 / r));
  const pr = (photon.signPr * Math.sqrt(potential) * r * r) / d;
  return ut - photon.lambda * uphi - ur * pr;
}

/** (−p·u)/E at a camera: γ(p^(t) − v·p) in its ZAMO frame. What `receivePhoton` calls energyFactor. */
export function receivedEnergy(
  camera: Camera,
  photon: Pick<ReceivedPhoton, "lambda" | "eta" | "signPr" | "signPtheta">,
): number {
  const { sign, pt, pr, ptheta, pphi } = zamoMomentum(camera, photon);
  const [vr, vth, vph] = camera.velocity;
  return sign * camera.gamma * (pt - vr * pr - vth * ptheta - vph * pphi);
}
