// Stars as a finely blurred sky: each a small Gaussian on the celestial sphere, looked up in the direction a light path
// comes from, so that bending magnifies stars by itself.
import type { Star } from "./catalogue";
import { colourTemperature } from "./catalogue";
import { skyRotation, worldDirection, type SkyOrientation } from "./orientation";
import { lookUpBlackBody } from "../shade/black-body-colour";

/**
 * The unit of star light: a star of magnitude 0, neither shifted nor magnified, gives as much light as luminance 1 over
 * this solid angle in sr, a square 0.1° wide. How bright that is beside the disk is the artist's `starStops`.
 */
export const magnitudeZeroSolidAngle = (0.1 * (Math.PI / 180)) ** 2;

// A Gaussian is cut where it has fallen to exp(−8); the cut takes 0.03 % of its light.
const cutInSigmas = 4;
const minimumCell = 0.01;

export interface StarField {
  sigma: number;
  bands: number;
  /** Cells of band b are firstCell[b] … firstCell[b + 1]. */
  firstCell: Uint32Array;
  /** Stars of cell c are members[start[c]] … members[start[c + 1]]. */
  start: Uint32Array;
  members: Uint32Array;
  /** Per star: direction x, y, z; temperature in K; peak luminance over the luminance of its black body. */
  stars: Float64Array;
}

const starNumbers = 5;

/** The field for one frame: sigma is the Gaussians' radius in radians, stops brighten every star by powers of two. */
export function prepareStarField(
  catalogue: readonly Star[],
  orientation: SkyOrientation,
  sigma: number,
  stops: number,
): StarField {
  const rotation = skyRotation(orientation);
  const unit = (magnitudeZeroSolidAngle * 2 ** stops) / (2 * Math.PI * sigma * sigma);
  const stars = new Float64Array(starNumbers * catalogue.length);
  const xyz = new Float64Array(3);
  catalogue.forEach((star, i) => {
    const temperature = colourTemperature(star.colourIndex);
    lookUpBlackBody(temperature, xyz);
    const peak = (unit * 10 ** (-0.4 * star.magnitude)) / xyz[1]!;
    stars.set([...worldDirection(rotation, star.raDeg, star.decDeg), temperature, peak], starNumbers * i);
  });
  return { sigma, stars, ...indexStars(stars, catalogue.length, cutInSigmas * sigma) };
}

/** Bands of equal height in θ, each cut into cells about as wide; a star is a member of every cell within the cut. */
function indexStars(stars: Float64Array, count: number, cut: number) {
  const bands = Math.max(2, Math.floor(Math.PI / Math.max(minimumCell, cut)));
  const firstCell = new Uint32Array(bands + 1);
  for (let b = 0; b < bands; b++) {
    const cells = Math.round(2 * bands * Math.sin((Math.PI * (b + 0.5)) / bands));
    firstCell[b + 1] = firstCell[b]! + Math.max(1, cells);
  }
  const cells = firstCell[bands]!;
  const start = new Uint32Array(cells + 1);
  forEachCell(stars, count, cut, firstCell, (cell) => start[cell + 1]!++);
  for (let c = 0; c < cells; c++) start[c + 1]! += start[c]!;
  const members = new Uint32Array(start[cells]!);
  const next = start.slice();
  forEachCell(stars, count, cut, firstCell, (cell, star) => (members[next[cell]!++] = star));
  return { bands, firstCell, start, members };
}

function forEachCell(
  stars: Float64Array,
  count: number,
  cut: number,
  firstCell: Uint32Array,
  visit: (cell: number, star: number) => void,
): void {
  const bands = firstCell.length - 1;
  for (let i = 0; i < count; i++) {
    const at = starNumbers * i;
    const theta = Math.acos(Math.max(-1, Math.min(1, stars[at + 2]!)));
    const phi = Math.atan2(stars[at + 1]!, stars[at]!);
    const last = Math.min(bands - 1, Math.floor(((theta + cut) / Math.PI) * bands));
    for (let b = Math.max(0, Math.floor(((theta - cut) / Math.PI) * bands)); b <= last; b++) {
      const cells = firstCell[b + 1]! - firstCell[b]!;
      // A cap of radius `cut` around θ spans asin(sin cut / sin θ) of azimuth, all of it where it holds a pole.
      const reach = Math.sin(cut) < Math.sin(theta) ? Math.asin(Math.sin(cut) / Math.sin(theta)) : Math.PI;
      const from = Math.floor(((phi - reach) / (2 * Math.PI)) * cells);
      const to = Math.min(from + cells - 1, Math.floor(((phi + reach) / (2 * Math.PI)) * cells));
      for (let c = from; c <= to; c++) visit(firstCell[b]! + (((c % cells) + cells) % cells), i);
    }
  }
}

const shifted = new Float64Array(3);

/**
 * Adds to `out` the X, Y, Z of the sky seen in the world direction (x, y, z), its light shifted by g: every star's
 * temperature T becomes gT, which carries both colour and brightness (PHYSICS §11).
 */
export function addStarLight(
  field: StarField,
  x: number,
  y: number,
  z: number,
  g: number,
  out: Float64Array,
): void {
  const { stars, members, start, sigma } = field;
  const cell = cellOf(field, x, y, z);
  const limit = (cutInSigmas * sigma) ** 2;
  for (let m = start[cell]!; m < start[cell + 1]!; m++) {
    const at = starNumbers * members[m]!;
    const dx = x - stars[at]!;
    const dy = y - stars[at + 1]!;
    const dz = z - stars[at + 2]!;
    const distance = dx * dx + dy * dy + dz * dz;
    if (distance > limit) continue;
    const weight = stars[at + 4]! * Math.exp(-distance / (2 * sigma * sigma));
    lookUpBlackBody(g * stars[at + 3]!, shifted);
    for (let k = 0; k < 3; k++) out[k]! += weight * shifted[k]!;
  }
}

function cellOf({ bands, firstCell }: StarField, x: number, y: number, z: number): number {
  const theta = Math.acos(Math.max(-1, Math.min(1, z)));
  const band = Math.min(bands - 1, Math.floor((theta / Math.PI) * bands));
  const cells = firstCell[band + 1]! - firstCell[band]!;
  const cell = Math.floor((Math.atan2(y, x) / (2 * Math.PI)) * cells);
  return firstCell[band]! + (((cell % cells) + cells) % cells);
}
