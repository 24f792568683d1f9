// From traced light paths to scene-linear pixels. Nothing here traces; a change of look needs only this.
import { addStarLight } from "../sky/star-field";
import { diskLight } from "./disk-light";
import type { FramePlan } from "./frame-plan";
import { sampleFates, type PathPlanes } from "./path-planes";

const light = new Float64Array(3);

/**
 * Scene-linear RGBA of the planes' pixels, premultiplied, samples averaged. Alpha is 1 where a path ends on the disk or in
 * the hole (or nowhere that could be found), 0 where it leaves for the sky or the lens sees nothing.
 */
export function shadePlanes(plan: FramePlan, planes: PathPlanes): Float32Array {
  const { samples, toPicture: m } = plan;
  const width = planes.width / samples;
  const sums = new Float64Array(4 * width * (planes.rows / samples));
  for (let i = 0, row = 0; row < planes.rows; row++)
    for (let column = 0; column < planes.width; column++, i++) {
      const at = 4 * (Math.floor(row / samples) * width + Math.floor(column / samples));
      sums[at + 3]! += shadeSample(plan, planes, i);
      for (let k = 0; k < 3; k++)
        sums[at + k]! += m[3 * k]! * light[0]! + m[3 * k + 1]! * light[1]! + m[3 * k + 2]! * light[2]!;
    }
  return Float32Array.from(sums, (sum) => sum / (samples * samples));
}

/** Leaves the sample's X, Y, Z in `light` and returns its alpha. */
function shadeSample({ disk, stars }: FramePlan, planes: PathPlanes, i: number): 0 | 1 {
  light.fill(0);
  switch (planes.fate[i]) {
    case sampleFates.disk:
      diskLight(disk!, planes.radius[i]!, planes.shift[i]!, light);
      return 1;
    case sampleFates.sky: {
      const at = 3 * i;
      if (stars)
        addStarLight(
          stars,
          planes.sky[at]!,
          planes.sky[at + 1]!,
          planes.sky[at + 2]!,
          planes.shift[i]!,
          light,
        );
      return 0;
    }
    case sampleFates.outsideLens:
      return 0;
    default:
      return 1;
  }
}
