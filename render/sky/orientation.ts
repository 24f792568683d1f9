// Where the catalogue's sky stands in the world, whose z axis is the hole's spin (PHYSICS §14).
import type { Setup } from "../scene/setup";

const radians = Math.PI / 180;

export type SkyOrientation = Pick<Setup["sky"], "poleRaDeg" | "poleDecDeg" | "turnDeg">;

/**
 * Rotation, nine numbers row by row, from equatorial axes (x to RA 0, z to Dec +90) to world axes: the pole's right
 * ascension to zero, the pole onto +z, then back by its right ascension and on by the turn. With the pole at Dec +90 and
 * no turn, φ = RA and θ = 90° − Dec.
 */
export function skyRotation({ poleRaDeg, poleDecDeg, turnDeg }: SkyOrientation): Float64Array {
  const ra = poleRaDeg * radians;
  const tilt = (90 - poleDecDeg) * radians;
  const back = (poleRaDeg + turnDeg) * radians;
  const [cosR, sinR] = [Math.cos(ra), Math.sin(ra)];
  const [cosT, sinT] = [Math.cos(tilt), Math.sin(tilt)];
  const [cosB, sinB] = [Math.cos(back), Math.sin(back)];
  return Float64Array.of(
    cosB * cosT * cosR + sinB * sinR,
    cosB * cosT * sinR - sinB * cosR,
    -cosB * sinT,
    sinB * cosT * cosR - cosB * sinR,
    sinB * cosT * sinR + cosB * cosR,
    -sinB * sinT,
    sinT * cosR,
    sinT * sinR,
    cosT,
  );
}

/** Unit vector in world axes of a place in the sky. */
export function worldDirection(
  rotation: Float64Array,
  raDeg: number,
  decDeg: number,
): [number, number, number] {
  const cosDec = Math.cos(decDeg * radians);
  const x = cosDec * Math.cos(raDeg * radians);
  const y = cosDec * Math.sin(raDeg * radians);
  const z = Math.sin(decDeg * radians);
  const row = (i: number) => rotation[i]! * x + rotation[i + 1]! * y + rotation[i + 2]! * z;
  return [row(0), row(3), row(6)];
}
