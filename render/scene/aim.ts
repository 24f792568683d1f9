// Which way the camera looks. Seat axes (right, up, forward) start "at the hole, spin axis up": forward = −e_r,
// up = −e_θ, right = +e_φ of the observer's own frame; then yaw, pitch and roll turn them (PHYSICS §14).
import type { Lens, Setup } from "./setup";

const radians = Math.PI / 180;

type Vector = readonly [number, number, number];

/** a·cos + b·sin: a turned toward b. */
const turn = (a: Vector, b: Vector, angleDeg: number): Vector => {
  const cos = Math.cos(angleDeg * radians);
  const sin = Math.sin(angleDeg * radians);
  return [a[0] * cos + b[0] * sin, a[1] * cos + b[1] * sin, a[2] * cos + b[2] * sin];
};

const negative = ([x, y, z]: Vector): Vector => [-x, -y, -z];

/**
 * The lens axes in the observer's frame: nine numbers, the (r, θ, φ) components of lens right, lens up and lens axis.
 * Yaw turns the view right, then pitch turns it up, then roll leans the camera's up to its right. A dome's axis is its
 * zenith, cos T·up + sin T·forward for tilt T, and its picture's top is the audience's back.
 */
export function lensAxes(camera: Setup["camera"]): Float64Array {
  let right: Vector = [0, 0, 1];
  let up: Vector = [0, -1, 0];
  let forward: Vector = [-1, 0, 0];
  [forward, right] = [turn(forward, right, camera.yawDeg), turn(right, negative(forward), camera.yawDeg)];
  [forward, up] = [turn(forward, up, camera.pitchDeg), turn(up, negative(forward), camera.pitchDeg)];
  [up, right] = [turn(up, right, camera.rollDeg), turn(right, negative(up), camera.rollDeg)];
  const [lensUp, axis] = mountLens(camera.lens, up, forward);
  return Float64Array.of(...right, ...lensUp, ...axis);
}

function mountLens(lens: Lens, up: Vector, forward: Vector): [Vector, Vector] {
  if (lens.kind !== "dome") return [up, forward];
  return [turn(negative(forward), up, lens.tiltDeg), turn(up, forward, lens.tiltDeg)];
}

/** Turns a direction in lens axes (right, up, axis) into components (r, θ, φ) of the observer's frame; may be in place. */
export function toObserverFrame(axes: Float64Array, direction: Float64Array, out: Float64Array): void {
  const [right, up, axis] = [direction[0]!, direction[1]!, direction[2]!];
  for (let i = 0; i < 3; i++) out[i] = right * axes[i]! + up * axes[3 + i]! + axis * axes[6 + i]!;
}
