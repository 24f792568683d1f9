// Setups of the size of a postage stamp, for tests that render.
import { defaultSetup, setupSchema, type Setup } from "@/render/scene/setup";

export interface Changes {
  hole?: Partial<Setup["hole"]>;
  camera?: Partial<Setup["camera"]>;
  disk?: Partial<NonNullable<Setup["disk"]>> | null;
  sky?: Partial<Setup["sky"]>;
  time?: Partial<Setup["time"]>;
  picture?: Partial<Setup["picture"]>;
}

/** The default setup at 96×54 pixels under a dark sky, with changes; always a valid one. */
export function smallSetup(changes: Changes = {}): Setup {
  const { hole, camera, disk, sky, time, picture } = defaultSetup;
  return setupSchema.parse({
    schema: 1,
    hole: { ...hole, ...changes.hole },
    camera: { ...camera, ...changes.camera },
    disk: changes.disk === null ? null : { ...disk, ...changes.disk },
    sky: { ...sky, kind: "dark", ...changes.sky },
    time: { ...time, ...changes.time },
    picture: { ...picture, width: 96, height: 54, ...changes.picture },
  });
}
