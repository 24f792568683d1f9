// Where a camera or a disk may not be, and the words that say why (FIELD §4, "Camera legality").
import { ergosurface, iscoRadius, outerHorizon, photonOrbit } from "../spacetime/orbits";
import { horizonFrame } from "./camera";
import { maximumFrames, type Setup } from "./setup-fields";

export interface Forbidden {
  path: (string | number)[];
  message: string;
}

const figure = (value: number) => value.toFixed(4).replace(/0+$/, "").replace(/\.$/, "");

/** Every way in which the setup's parts contradict each other; empty when it can be rendered. */
export function findForbidden(setup: Setup): Forbidden[] {
  return [
    ...forbiddenCamera(setup),
    ...forbiddenDisk(setup),
    ...forbiddenFrames(setup),
    ...forbiddenFall(setup),
    ...forbiddenRaster(setup),
  ];
}

function forbiddenCamera({ hole, camera, disk }: Setup): Forbidden[] {
  const at = (field: string, message: string) => [{ path: ["camera", field], message }];
  const horizon = outerHorizon(hole.spin);
  if (camera.radius <= horizon)
    return at(
      "radius",
      `The camera is inside the horizon. At this spin it must be beyond ${figure(horizon)} M.`,
    );

  const cosTheta = Math.cos((camera.inclinationDeg * Math.PI) / 180);
  const ergo = ergosurface(hole.spin, cosTheta);
  if (camera.observer === "held" && camera.radius <= ergo)
    return at(
      "radius",
      `Nothing can be held still inside the ergosphere, which reaches ${figure(ergo)} M here. Move the camera out, or let it have zero angular momentum.`,
    );

  if (camera.observer !== "circular-orbit") return [];
  if (Math.abs(camera.inclinationDeg - 90) > 1e-9)
    return at(
      "inclinationDeg",
      "A camera on a circular orbit is in the plane of the disk: its inclination must be 90°.",
    );
  const limit = photonOrbit(hole.spin, disk?.sense ?? "prograde");
  return camera.radius > limit
    ? []
    : at(
        "radius",
        `There is no circular orbit at or inside the photon orbit, ${figure(limit)} M at this spin.`,
      );
}

function forbiddenDisk({ hole, disk }: Setup): Forbidden[] {
  if (!disk) return [];
  const isco = iscoRadius(hole.spin, disk.sense);
  const inner = disk.innerEdge === "isco" ? isco : disk.innerEdge;
  const forbidden: Forbidden[] = [];
  if (inner < isco)
    forbidden.push({
      path: ["disk", "innerEdge"],
      message: `The disk cannot begin inside the innermost stable orbit, ${figure(isco)} M at this spin and sense.`,
    });
  if (disk.outerEdge <= inner)
    forbidden.push({
      path: ["disk", "outerEdge"],
      message: `The outer edge must be beyond the inner edge, which is at ${figure(inner)} M.`,
    });
  return forbidden;
}

function forbiddenFrames({ time }: Setup): Forbidden[] {
  const count = time.last - time.first + 1;
  if (count < 1)
    return [{ path: ["time", "last"], message: "The last frame must not come before the first." }];
  if (count > maximumFrames)
    return [
      {
        path: ["time", "last"],
        message: `${count} frames are more than one shot may hold, ${maximumFrames.toLocaleString("en")}. Split the shot.`,
      },
    ];
  return [];
}

function forbiddenFall(setup: Setup): Forbidden[] {
  const { hole, camera, time } = setup;
  if (camera.observer !== "falling" || camera.radius <= outerHorizon(hole.spin)) return [];
  const reached = horizonFrame(setup);
  if (time.last < reached) return [];
  const message = `The falling camera reaches the horizon at frame ${reached}. End before that frame, or begin farther out.`;
  return [{ path: ["time", "last"], message }];
}

function forbiddenRaster({ camera, picture }: Setup): Forbidden[] {
  if (camera.lens.kind === "dome" && picture.width !== picture.height)
    return [{ path: ["picture", "height"], message: "A dome frame is square: height must equal width." }];
  if (camera.lens.kind === "panorama" && picture.width !== 2 * picture.height)
    return [
      {
        path: ["picture", "height"],
        message: "A panorama is twice as wide as high: height must be half the width.",
      },
    ];
  return [];
}
