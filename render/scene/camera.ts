// Where the camera is at a frame, and who is looking there (PHYSICS §14): its own clock runs with the frame rate.
import { cameraAt } from "../spacetime/clocks";
import { fallTime } from "../spacetime/fall";
import { createCamera, type Camera } from "../spacetime/observers";
import { timeInM, timeInSeconds } from "../units";
import type { Setup } from "./setup-fields";

/** cos θ of the camera. */
export const cosInclination = ({ camera }: Pick<Setup, "camera">) =>
  Math.cos((camera.inclinationDeg * Math.PI) / 180);

/** Proper time of the camera since the first frame, in M: (frame − first)/rate seconds. */
export function properTime({ time, hole }: Pick<Setup, "time" | "hole">, frame: number): number {
  return timeInM(hole.massSolar, ((frame - time.first) * time.rate.denominator) / time.rate.numerator);
}

/** The first frame at which a falling camera is in the horizon, whether or not the setup goes so far. */
export function horizonFrame(setup: Pick<Setup, "hole" | "camera" | "time">): number {
  const { hole, camera, time } = setup;
  const seconds = timeInSeconds(hole.massSolar, fallTime(hole.spin, camera.radius, cosInclination(setup)));
  return time.first + Math.ceil((seconds * time.rate.numerator) / time.rate.denominator);
}

export interface CameraAtFrame {
  /** The observer: place, velocity and frame. */
  observer: Camera;
  /** Azimuth in radians since the first frame's φ = 0. */
  phi: number;
  /** Far-away time in M since the first frame. */
  t: number;
}

/**
 * The camera at a frame. It starts at φ = 0; orbiting and zero-angular-momentum cameras turn in φ, a falling one falls.
 * Throws a RangeError, in words, where it cannot exist or has reached the horizon.
 */
export function cameraAtFrame(setup: Setup, frame: number): CameraAtFrame {
  const { hole, camera } = setup;
  const sense = setup.disk?.sense ?? "prograde";
  const tau = properTime(setup, frame);
  const place = cameraAt(camera.observer, hole.spin, camera.radius, cosInclination(setup), sense, tau);
  if (place.reached === "horizon")
    throw new RangeError(
      `The falling camera is in the horizon at frame ${frame}. End before it, or begin farther out.`,
    );
  const { radius, cosTheta, phi, t } = place;
  return { observer: createCamera(camera.observer, hole.spin, radius, cosTheta, sense), phi, t };
}
