// The setup: its fields, and that they do not contradict each other. One schema serves the form, the route handlers, the
// worker and the command line.
import { findForbidden } from "./legality";
import { setupFields, type Setup } from "./setup-fields";

export { frameRates, maximumFrames, observerKinds } from "./setup-fields";
export type { Disk, Lens, ObserverKind, Setup } from "./setup-fields";

export const setupSchema = setupFields.superRefine((setup, context) => {
  for (const { path, message } of findForbidden(setup)) context.addIssue({ code: "custom", path, message });
});

/** A shot's first setup: every value at FIELD §2's default, a 1.85 film frame in the 960-wide proof size. */
export const defaultSetup: Setup = {
  schema: 1,
  hole: { massSolar: 4e7, spin: 0.6 },
  camera: {
    observer: "held",
    radius: 30,
    inclinationDeg: 80,
    yawDeg: 0,
    pitchDeg: 0,
    rollDeg: 0,
    lens: { kind: "rectilinear", horizontalFieldDeg: 50 },
  },
  disk: { sense: "prograde", innerEdge: "isco", outerEdge: 20, peakTemperatureK: 9000 },
  sky: { kind: "stars", poleRaDeg: 0, poleDecDeg: 90, turnDeg: 0, starStops: 0 },
  time: { rate: { numerator: 24, denominator: 1 }, first: 1001, last: 1024 },
  picture: { width: 1998, height: 1080, exposureStops: 0 },
};
