// Cameras: who looks, how fast they move, and which photon arrives from a direction they look in.
// Every frame here is the zero-angular-momentum (ZAMO) tetrad followed by an ordinary Lorentz boost
// (Bardeen, Press & Teukolsky 1972 §III, cited as BPT; Misner, Thorne & Wheeler 1973 §33.4). Units G = c = M = 1.
import { axialRadius, bigA, frameDragging, lapse, sigma, sinSquared } from "./kerr";
import { circularSpeed, ergosurface, outerHorizon, photonOrbit, type Sense } from "./orbits";

export type Observer = "held" | "zero-angular-momentum" | "circular-orbit" | "falling";

/** Velocity in the ZAMO frame, in c, along (r, θ, φ). */
export type Velocity = readonly [number, number, number];

/** An observer at an event: place, velocity in the ZAMO frame, and the local quantities a direction needs. */
export interface Camera {
  a: number;
  radius: number;
  cosTheta: number;
  velocity: Velocity;
  /** Lorentz factor 1/√(1−v²) in the ZAMO frame. */
  gamma: number;
  lapse: number;
  frameDragging: number;
  /** √g_φφ, in M. */
  axialRadius: number;
  sigma: number;
}

/**
 * Velocity of an observer in the ZAMO frame, in c (BPT §III; PHYSICS §5).
 * Held: v_φ = −ω√g_φφ/α. Circular orbit: BPT eq. 3.10. Falling: from rest at infinity (E = 1, L = Q = 0),
 * v_r = −√(2r(r²+a²)/A). Throws RangeError where the observer cannot exist: at or inside the horizon, held at or
 * inside the ergosurface, orbiting off the equator or at or inside the photon orbit.
 */
export function observerVelocity(
  kind: Observer,
  a: number,
  radius: number,
  cosTheta: number,
  sense: Sense = "prograde",
): Velocity {
  if (!(radius > outerHorizon(a))) throw new RangeError(`r = ${radius} M is not outside the horizon.`);
  if (kind === "zero-angular-momentum") return [0, 0, 0];
  if (kind === "falling")
    return [-Math.sqrt((2 * radius * (radius * radius + a * a)) / bigA(a, radius, cosTheta)), 0, 0];
  if (kind === "held") {
    if (!(radius > ergosurface(a, cosTheta)))
      throw new RangeError(`Nothing is held still at r = ${radius} M, inside the ergosphere.`);
    const dragging = frameDragging(a, radius, cosTheta) * axialRadius(a, radius, cosTheta);
    return [0, 0, -dragging / lapse(a, radius, cosTheta)];
  }
  if (Math.abs(cosTheta) > 1e-11) throw new RangeError("A circular orbit lies in the equatorial plane.");
  if (!(radius > photonOrbit(a, sense)))
    throw new RangeError(`There is no circular orbit at r = ${radius} M, at or inside the photon orbit.`);
  return [0, 0, circularSpeed(a, radius, sense)];
}

/** An observer of the given velocity in the ZAMO frame at (radius, cosTheta). */
export function placeCamera(a: number, radius: number, cosTheta: number, velocity: Velocity): Camera {
  const [vr, vth, vph] = velocity;
  return {
    a,
    radius,
    cosTheta,
    velocity,
    gamma: 1 / Math.sqrt(1 - (vr * vr + vth * vth + vph * vph)),
    lapse: lapse(a, radius, cosTheta),
    frameDragging: frameDragging(a, radius, cosTheta),
    axialRadius: axialRadius(a, radius, cosTheta),
    sigma: sigma(a, radius, cosTheta),
  };
}

/** One of the four observers at (radius, cosTheta). Throws RangeError where it cannot exist. */
export function createCamera(
  kind: Observer,
  a: number,
  radius: number,
  cosTheta: number,
  sense: Sense = "prograde",
): Camera {
  return placeCamera(a, radius, cosTheta, observerVelocity(kind, a, radius, cosTheta, sense));
}

/** A photon as an observer receives it: what a light path starts from. */
export interface ReceivedPhoton {
  /** λ = L/E and η = Q/E². */
  lambda: number;
  eta: number;
  /** Signs of the future-directed p_r and p_θ. */
  signPr: 1 | -1;
  signPtheta: 1 | -1;
  /** (−p·u_obs)/E: what the observer measures per unit of energy at infinity. Negative for E < 0. */
  energyFactor: number;
  /** Azimuth from which the path's dphi counts: zero, but for a camera on the axis the half-plane it looks into. */
  phiStart: number;
}

export function createReceivedPhoton(): ReceivedPhoton {
  return { lambda: 0, eta: 0, signPr: 1, signPtheta: 1, energyFactor: 1, phiStart: 0 };
}

/**
 * The photon that arrives from the direction n = (n_r, n_θ, n_φ) the observer looks in, in its own rest frame
 * (camera forward = −e_r, up = −e_θ, right = +e_φ; n need not be of unit length). Writes into `photon`.
 * It arrives with p = (1, −n); boosted to the ZAMO frame, L = √g_φφ p^(φ), E = αp^(t) + ωL, λ = L/E,
 * η = Σ(p^(θ))²/E² − cos²θ(a² − λ²/sin²θ) (PHYSICS §6). On the axis λ = 0 and η = Σ(p_⊥)²/E² − a².
 */
export function receivePhoton(
  camera: Camera,
  nr: number,
  ntheta: number,
  nphi: number,
  photon: ReceivedPhoton,
): void {
  const { a, cosTheta, velocity, gamma, sigma: s } = camera;
  const length = Math.sqrt(nr * nr + ntheta * ntheta + nphi * nphi);
  const qr = -nr / length;
  const qth = -ntheta / length;
  const qph = -nphi / length;

  // Boost from the observer's frame, which moves with v, to the ZAMO frame.
  const along = velocity[0] * qr + velocity[1] * qth + velocity[2] * qph;
  const pt = gamma * (1 + along);
  const push = gamma + ((gamma * gamma) / (1 + gamma)) * along;
  const pr = qr + push * velocity[0];
  const pth = qth + push * velocity[1];
  const pph = qph + push * velocity[2];

  const angular = camera.axialRadius * pph;
  const energy = camera.lapse * pt + camera.frameDragging * angular;
  const lambda = angular / energy;
  const sin2 = sinSquared(cosTheta);
  photon.energyFactor = 1 / energy;
  photon.signPr = pr < 0 ? -1 : 1;
  if (sin2 > 0) {
    photon.lambda = lambda;
    photon.eta =
      (s * pth * pth) / (energy * energy) - cosTheta * cosTheta * (a * a - (lambda * lambda) / sin2);
    photon.signPtheta = pth < 0 ? -1 : 1;
    photon.phiStart = 0;
    return;
  }
  // On the axis the path leaves in the half-plane it looks into, towards the equator.
  photon.lambda = 0;
  photon.eta = (s * (pth * pth + pph * pph)) / (energy * energy) - a * a;
  photon.signPtheta = cosTheta > 0 ? -1 : 1;
  photon.phiStart = Math.atan2(-pph, cosTheta > 0 ? -pth : pth);
}

type Constants = Pick<ReceivedPhoton, "lambda" | "eta" | "signPr" | "signPtheta">;

/**
 * Momentum per unit |E| of a photon of given constants in the ZAMO frame at a camera off the axis: p^(t) = |1 − ωλ|/α,
 * p^(φ) = λ/√g_φφ, (p^(θ))² = Θ/Σ, and p^(r) from p·p = 0 (PHYSICS §§3, 5). `sign` is that of E.
 */
export function zamoMomentum(camera: Camera, { lambda, eta, signPr, signPtheta }: Constants) {
  const { a, cosTheta } = camera;
  const dragged = 1 - camera.frameDragging * lambda;
  const sign = dragged < 0 ? -1 : 1;
  const pt = Math.abs(dragged) / camera.lapse;
  const pphi = (sign * lambda) / camera.axialRadius;
  const polar = eta + cosTheta * cosTheta * (a * a - (lambda * lambda) / sinSquared(cosTheta));
  const ptheta = signPtheta * Math.sqrt(Math.max(0, polar) / camera.sigma);
  const pr = signPr * Math.sqrt(Math.max(0, (pt - pphi) * (pt + pphi) - ptheta * ptheta));
  return { sign, pt, pr, ptheta, pphi };
}

/**
 * The direction, in the observer's own rest frame, in which a photon of given constants is seen: the inverse of
 * `receivePhoton` off the axis. Unit vector (n_r, n_θ, n_φ).
 */
export function directionOfPhoton(camera: Camera, photon: Constants): [number, number, number] {
  const { velocity, gamma } = camera;
  const { pt, pr, ptheta, pphi } = zamoMomentum(camera, photon);
  const along = velocity[0] * pr + velocity[1] * ptheta + velocity[2] * pphi;
  const push = ((gamma * gamma) / (1 + gamma)) * along - gamma * pt;
  const seen = gamma * (pt - along);
  return [
    -(pr + push * velocity[0]) / seen,
    -(ptheta + push * velocity[1]) / seen,
    -(pphi + push * velocity[2]) / seen,
  ];
}

/**
 * The observer's orthonormal tetrad (e_t, e_r, e_θ, e_φ) as vectors of (t, r, θ, φ) components: the ZAMO tetrad
 * (BPT eq. 3.2) boosted by the observer's velocity. Not defined on the axis, where ∂_φ vanishes.
 */
export function tetrad(camera: Camera): [number[], number[], number[], number[]] {
  const { a, radius: r, velocity, gamma } = camera;
  const rootDelta = Math.sqrt(r * r - 2 * r + a * a);
  const rootSigma = Math.sqrt(camera.sigma);
  const zamo = [
    [1 / camera.lapse, 0, 0, camera.frameDragging / camera.lapse],
    [0, rootDelta / rootSigma, 0, 0],
    [0, 0, 1 / rootSigma, 0],
    [0, 0, 0, 1 / camera.axialRadius],
  ];
  const factor = (gamma * gamma) / (1 + gamma);
  const boosted = (weights: number[]) =>
    [0, 1, 2, 3].map((i) => zamo.reduce((sum, leg, k) => sum + (weights[k] ?? 0) * (leg[i] ?? 0), 0));
  const leg = (axis: 0 | 1 | 2) =>
    boosted([
      gamma * velocity[axis],
      ...velocity.map((v, i) => (i === axis ? 1 : 0) + factor * velocity[axis] * v),
    ]);
  return [boosted([gamma, ...velocity.map((v) => gamma * v)]), leg(0), leg(1), leg(2)];
}

/**
 * Special-relativistic aberration (Einstein 1905): angle between the direction to a source and the camera's motion,
 * and frequency ratio, after a boost of speed β. cos θ' = (cos θ+β)/(1+β cos θ), D = γ(1+β cos θ);
 * dΩ'/dΩ = D⁻², bolometric radiance ×D⁴.
 */
export function aberrate(cosTheta: number, beta: number): { cosTheta: number; doppler: number } {
  const gamma = 1 / Math.sqrt(1 - beta * beta);
  return { cosTheta: (cosTheta + beta) / (1 + beta * cosTheta), doppler: gamma * (1 + beta * cosTheta) };
}
