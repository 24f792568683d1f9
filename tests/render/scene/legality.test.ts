// Where a camera or a disk may not be (FIELD §4, "Camera legality"). Radii: Bardeen, Press & Teukolsky 1972.
import { describe, expect, it } from "vitest";
import { setupSchema } from "@/render/scene/setup";
import { smallSetup } from "../shade/small-setup";

const valid = smallSetup();
type Part = keyof typeof valid;

/** What the schema says to the valid setup with some of its parts changed: "path: message" each. */
function refusals(changes: Partial<Record<Part, object | null>>) {
  const parts = Object.entries(changes).map(([name, change]) => [
    name,
    change === null ? null : { ...(valid[name as Part] as object), ...change },
  ]);
  const parsed = setupSchema.safeParse({ ...valid, ...(Object.fromEntries(parts) as object) });
  return parsed.success
    ? []
    : parsed.error.issues.map(({ path, message }) => `${path.join(".")}: ${message}`);
}

describe("a camera", () => {
  it("inside the horizon is refused, with the horizon's radius", () => {
    expect(refusals({ hole: { spin: 0 }, camera: { radius: 2 } })).toEqual([
      "camera.radius: The camera is inside the horizon. At this spin it must be beyond 2 M.",
    ]);
    expect(refusals({ hole: { spin: 0 }, camera: { radius: 2.001 } })).toEqual([]);
  });

  it("held inside the ergosphere is refused there, but not with zero angular momentum, and not on the axis", () => {
    const hole = { spin: 0.9 };
    expect(refusals({ hole, camera: { radius: 1.9, inclinationDeg: 90 } })).toEqual([
      "camera.radius: Nothing can be held still inside the ergosphere, which reaches 2 M here. Move the camera out, or let it have zero angular momentum.",
    ]);
    expect(
      refusals({ hole, camera: { radius: 1.9, inclinationDeg: 90, observer: "zero-angular-momentum" } }),
    ).toEqual([]);
    expect(refusals({ hole, camera: { radius: 1.9, inclinationDeg: 0 } })).toEqual([]);
  });

  it("orbiting must be in the plane and outside the photon orbit of the disk's sense", () => {
    const orbit = { observer: "circular-orbit", inclinationDeg: 90 };
    expect(refusals({ hole: { spin: 0.9 }, camera: { ...orbit, radius: 1.55 } })).toEqual([
      "camera.radius: There is no circular orbit at or inside the photon orbit, 1.5579 M at this spin.",
    ]);
    expect(
      refusals({ hole: { spin: 0.9 }, camera: { ...orbit, radius: 3.9 }, disk: { sense: "retrograde" } }),
    ).toEqual([
      "camera.radius: There is no circular orbit at or inside the photon orbit, 3.9103 M at this spin.",
    ]);
    expect(refusals({ camera: { ...orbit, inclinationDeg: 80 } })).toEqual([
      "camera.inclinationDeg: A camera on a circular orbit is in the plane of the disk: its inclination must be 90°.",
    ]);
  });
});

describe("a disk", () => {
  it("must begin at or outside the innermost stable orbit of its sense", () => {
    expect(refusals({ hole: { spin: 0.9 }, disk: { innerEdge: 2.3 } })).toEqual([
      "disk.innerEdge: The disk cannot begin inside the innermost stable orbit, 2.3209 M at this spin and sense.",
    ]);
    expect(refusals({ hole: { spin: 0.9 }, disk: { innerEdge: 8.7, sense: "retrograde" } })).toHaveLength(1);
    expect(refusals({ hole: { spin: 0.9 }, disk: { innerEdge: 2.33 } })).toEqual([]);
  });

  it("must end outside its beginning, and may be absent", () => {
    expect(refusals({ hole: { spin: 0 }, disk: { outerEdge: 5 } })).toEqual([
      "disk.outerEdge: The outer edge must be beyond the inner edge, which is at 6 M.",
    ]);
    expect(refusals({ disk: null })).toEqual([]);
  });
});

describe("a range of frames", () => {
  it("must not end before it begins, nor be absurdly long", () => {
    expect(refusals({ time: { first: 10, last: 9 } })).toEqual([
      "time.last: The last frame must not come before the first.",
    ]);
    expect(refusals({ time: { first: 0, last: 20_000 } })).toEqual([
      "time.last: 20001 frames are more than one shot may hold, 20,000. Split the shot.",
    ]);
  });
});

describe("a raster", () => {
  it("is square for a dome and twice as wide as high for a panorama", () => {
    const dome = { lens: { kind: "dome", fieldDeg: 180, tiltDeg: 0 } };
    expect(refusals({ camera: dome })).toEqual([
      "picture.height: A dome frame is square: height must equal width.",
    ]);
    expect(refusals({ camera: { lens: { kind: "panorama" } } })).toEqual([
      "picture.height: A panorama is twice as wide as high: height must be half the width.",
    ]);
    expect(refusals({ camera: dome, picture: { width: 64, height: 64 } })).toEqual([]);
  });
});
