// Lenses: pixel → direction in lens axes (right, up, axis). Pixel coordinates are whole at pixel centres, (0, 0) is the
// top-left pixel, y grows downward. What the lens axes are in space is the camera's business (camera.ts).
import type { Lens } from "./setup";

const radians = Math.PI / 180;

export interface Raster {
  width: number;
  height: number;
}

/**
 * Writes the unit direction (right, up, axis) seen at pixel coordinates (px, py); false when the lens sees nothing there
 * (outside a dome's circle). Rectilinear: tan of the angle grows with distance from the centre. Dome: equidistant,
 * angle = ρ·field/2 with ρ = 1 at the circle that touches the edges. Panorama: longitude 2π(px+½)/W − π, latitude
 * π/2 − π(py+½)/H, so that longitude 0 is the axis and grows to the right.
 */
export function lensDirection(
  lens: Lens,
  raster: Raster,
  px: number,
  py: number,
  out: Float64Array,
): boolean {
  const x = px + 0.5 - raster.width / 2;
  const y = raster.height / 2 - py - 0.5;
  switch (lens.kind) {
    case "rectilinear":
      return rectilinear(x, y, pinholeScale(lens.horizontalFieldDeg, raster.width), out);
    case "dome":
      return equidistant(x, y, (lens.fieldDeg * radians) / raster.width, raster.width / 2, out);
    case "panorama":
      return equirectangular((x * 2 * Math.PI) / raster.width, (y * Math.PI) / raster.height, out);
  }
}

/** Tangent of the angle that one pixel spans at the centre. */
const pinholeScale = (fieldDeg: number, width: number) => (2 * Math.tan((fieldDeg * radians) / 2)) / width;

function rectilinear(x: number, y: number, scale: number, out: Float64Array): true {
  const right = x * scale;
  const up = y * scale;
  const length = Math.sqrt(right * right + up * up + 1);
  out[0] = right / length;
  out[1] = up / length;
  out[2] = 1 / length;
  return true;
}

function equidistant(x: number, y: number, anglePerPixel: number, edge: number, out: Float64Array): boolean {
  const distance = Math.sqrt(x * x + y * y);
  if (distance > edge) return false;
  const theta = distance * anglePerPixel;
  const spread = distance === 0 ? 0 : Math.sin(theta) / distance;
  out[0] = x * spread;
  out[1] = y * spread;
  out[2] = Math.cos(theta);
  return true;
}

function equirectangular(longitude: number, latitude: number, out: Float64Array): true {
  out[0] = Math.cos(latitude) * Math.sin(longitude);
  out[1] = Math.sin(latitude);
  out[2] = Math.cos(latitude) * Math.cos(longitude);
  return true;
}

/**
 * Solid angle of the pixel at (px, py) in sr; 0 outside a dome's circle. Rectilinear: scale²·cos³ of the angle from the
 * axis (small pixels). Dome: (sin θ/θ)·(field/N)² (small pixels). Panorama: 2π/W·(sin top − sin bottom), exact.
 */
export function pixelSolidAngle(lens: Lens, raster: Raster, px: number, py: number): number {
  const direction = new Float64Array(3);
  if (!lensDirection(lens, raster, px, py, direction)) return 0;
  const axis = direction[2]!;
  switch (lens.kind) {
    case "rectilinear":
      return pinholeScale(lens.horizontalFieldDeg, raster.width) ** 2 * axis ** 3;
    case "dome": {
      const theta = Math.acos(Math.max(-1, Math.min(1, axis)));
      return (theta === 0 ? 1 : Math.sin(theta) / theta) * ((lens.fieldDeg * radians) / raster.width) ** 2;
    }
    case "panorama": {
      const row = Math.PI / raster.height;
      const middle = Math.PI / 2 - (py + 0.5) * row;
      return ((2 * Math.PI) / raster.width) * 2 * Math.cos(middle) * Math.sin(row / 2);
    }
  }
}

/** The angle in radians that one pixel spans at the middle of the picture. */
export function pixelAngle(lens: Lens, raster: Raster): number {
  if (lens.kind === "rectilinear") return pinholeScale(lens.horizontalFieldDeg, raster.width);
  return (lens.kind === "dome" ? lens.fieldDeg * radians : 2 * Math.PI) / raster.width;
}

/** Horizontal field in degrees of a lens of that focal length before a sensor of that width: 2 atan(w/2f). */
export function fieldOfFocalLength(focalMm: number, sensorWidthMm: number): number {
  return (2 * Math.atan(sensorWidthMm / (2 * focalMm))) / radians;
}
