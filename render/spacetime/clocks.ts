// Clocks: how fast each observer's runs, and where its own time has taken it.
// Bardeen, Press & Teukolsky 1972 (BPT) §III for the frames; PHYSICS §§2, 5 for the circular and falling motions.
import { accelerationInSi, gravitationalRadius } from "../units";
import { fallFor, type CameraPlace } from "./fall";
import { bigA, delta, sigma, sinSquared } from "./kerr";
import { createCamera, type Camera, type Observer } from "./observers";
import type { Sense } from "./orbits";

/** Clock rate dτ/dt = α/γ of a camera against far-away time, dimensionless (BPT §III). */
export function clockRate(camera: Camera): number {
  return camera.lapse / camera.gamma;
}

/** dφ/dt = ω + αv_φ/√g_φφ of a camera, in 1/M (BPT eq. 3.3). On the axis, where φ means nothing, ω. */
export function angularVelocity(camera: Camera): number {
  if (camera.axialRadius === 0) return camera.frameDragging;
  return camera.frameDragging + (camera.lapse * camera.velocity[2]) / camera.axialRadius;
}

/**
 * Where an observer that is at `radius`, φ = 0, t = 0 at proper time zero is at `properTime`. Lengths and times in M.
 * Held, zero-angular-momentum and orbiting cameras keep r and θ and turn at a steady dφ/dt; a falling one keeps θ
 * and follows `fallFor`. Throws RangeError where the observer cannot exist.
 */
export function cameraAt(
  kind: Observer,
  a: number,
  radius: number,
  cosTheta: number,
  sense: Sense,
  properTime: number,
): CameraPlace {
  const camera = createCamera(kind, a, radius, cosTheta, sense);
  if (kind === "falling") return fallFor(a, radius, cosTheta, properTime);
  const t = properTime / clockRate(camera);
  const phi = kind === "held" ? 0 : angularVelocity(camera) * t;
  return { reached: "place", radius, cosTheta, phi, t };
}

/**
 * Proper acceleration a camera needs to stay where it is, in 1/M: the gradient of ln √(−g_tt) when held, of ln α when
 * of zero angular momentum (Misner, Thorne & Wheeler 1973 exercise 6.8 and eq. 33.22, numbers from memory).
 * Zero for the two that move freely.
 */
export function properAcceleration(kind: Observer, a: number, radius: number, cosTheta: number): number {
  if (kind === "circular-orbit" || kind === "falling") return 0;
  const r = radius;
  const s = sigma(a, r, cosTheta);
  const sin2 = sinSquared(cosTheta);
  const sinCos = cosTheta * Math.sqrt(sin2);
  let alongR: number;
  let alongTheta: number;
  if (kind === "held") {
    const potential = 1 - (2 * r) / s;
    alongR = (r * r - a * a * cosTheta * cosTheta) / (s * s * potential);
    alongTheta = (-2 * r * a * a * sinCos) / (s * s * potential);
  } else {
    const d = delta(a, r);
    const area = bigA(a, r, cosTheta);
    const areaSlope = 4 * r * (r * r + a * a) - a * a * sin2 * (2 * r - 2);
    alongR = (r - 1) / d + r / s - areaSlope / (2 * area);
    alongTheta = a * a * sinCos * (d / area - 1 / s);
  }
  return Math.sqrt((delta(a, r) * alongR * alongR + alongTheta * alongTheta) / s);
}

/** The same in m/s². */
export function properAccelerationInSi(
  massSolar: number,
  kind: Observer,
  a: number,
  radius: number,
  cosTheta: number,
): number {
  return accelerationInSi(massSolar, properAcceleration(kind, a, radius, cosTheta));
}

/**
 * Tidal stretch 2GML/r³ between the ends of a body of length L metres pointing at the hole, in m/s²
 * (Misner, Thorne & Wheeler 1973 §32.6, exact for radial fall at a = 0). `radius` in M.
 */
export function tidalStretch(massSolar: number, radius: number, lengthMetres: number): number {
  const unit = gravitationalRadius(massSolar);
  return accelerationInSi(massSolar, (2 * (lengthMetres / unit)) / radius ** 3);
}
