// Everything of a frame that is the same for all its pixels, worked out once.
import { lensAxes } from "../scene/aim";
import { cameraAtFrame, type CameraAtFrame } from "../scene/camera";
import { pixelAngle } from "../scene/lenses";
import type { Setup } from "../scene/setup";
import type { Star } from "../sky/catalogue";
import { prepareStarField, type StarField } from "../sky/star-field";
import { xyzToWorking, type ColourSpace } from "./colour-spaces";
import { planDisk, type DiskPlan } from "./disk-light";
import { samplesPerAxis, type Quality } from "./quality";

export interface FramePlan {
  setup: Setup;
  camera: CameraAtFrame;
  /** Lens axes in the observer's frame (scene/aim.ts). */
  axes: Float64Array;
  /** Light paths per pixel along each axis. */
  samples: number;
  disk: DiskPlan | null;
  stars: StarField | null;
  /** Relative XYZ, disk's peak at Y = 1, to the working space at the setup's exposure; nine numbers, row by row. */
  toPicture: Float64Array;
}

/** A star is drawn this many pixels wide (one sigma): wide enough that no star falls between two samples. */
const starSigmaPixels = 0.65;
/** The star field's index assumes stars much smaller than the sky. */
const widestStar = 0.25;

/**
 * The plan of one frame. `catalogue` is needed when the setup's sky has stars. Throws a RangeError, in words, when the
 * camera cannot be where the frame wants it.
 */
export function planFrame(
  setup: Setup,
  frame: number,
  quality: Quality,
  colourSpace: ColourSpace,
  catalogue: readonly Star[] | null,
): FramePlan {
  const { camera, sky, picture } = setup;
  if (sky.kind === "stars" && !catalogue)
    throw new RangeError("This setup's sky has stars and no catalogue was given.");
  const sigma = Math.min(widestStar, starSigmaPixels * pixelAngle(camera.lens, picture));
  const exposure = 2 ** picture.exposureStops;
  return {
    setup,
    camera: cameraAtFrame(setup, frame),
    axes: lensAxes(camera),
    samples: samplesPerAxis[quality],
    disk: setup.disk && planDisk(setup.hole.spin, setup.disk),
    stars: sky.kind === "stars" ? prepareStarField(catalogue!, sky, sigma, sky.starStops) : null,
    toPicture: Float64Array.from(xyzToWorking(colourSpace).flat(), (value) => value * exposure),
  };
}
