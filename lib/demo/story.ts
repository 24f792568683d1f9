// The demonstration's invented studio: names, shots and what became of each. Nothing in it is taken from any real
// production, place or person.
import { defaultSetup, type Setup } from "@/render/scene/setup";

export const studio = "Quillon & Sound";

export const cast = {
  owner: { name: "Maren Tolvik", email: "owner@ringwright.example", timeZone: "Europe/Oslo" },
  artist: { name: "Ilo Castrane", email: "artist@ringwright.example", timeZone: "Europe/Lisbon" },
  advisor: { name: "Sunniva Adeyra", email: "advisor@ringwright.example", timeZone: "Europe/Berlin" },
  producer: { name: "Corin Haldwell", email: "producer@ringwright.example", timeZone: "Europe/London" },
  client: { name: "Petra Vossling", email: "client@ringwright.example", timeZone: "America/Montreal" },
} as const;

/** How far each demonstration shot has come; the maker carries it there by the same verbs that people use. */
export type Fate =
  | "open"
  | "rendering"
  | "stopped"
  | "ready"
  | "in review"
  | "returned"
  | "signed off"
  | "delivered"
  | "received"
  | "refused"
  | "on hold"
  | "omitted";

export interface StoryShot {
  code: string;
  brief: string;
  /** Days from today; negative is past. */
  dueInDays: number;
  fate: Fate;
  setup: Setup;
  words?: string;
}

export interface StoryProduction {
  code: string;
  name: string;
  kind: "film" | "dome";
  sequences: { number: number; name: string; shots: StoryShot[] }[];
}

type Change = {
  hole?: Partial<Setup["hole"]>;
  camera?: Partial<Setup["camera"]>;
  disk?: Partial<NonNullable<Setup["disk"]>> | null;
  sky?: Partial<Setup["sky"]>;
  frames?: number;
  picture?: Partial<Setup["picture"]>;
};

const filmRaster = { width: 640, height: 346 };
const domeRaster = { width: 480, height: 480 };

function filmSetup(change: Change): Setup {
  const { hole, camera, disk, sky, frames = 2, picture } = change;
  return {
    ...defaultSetup,
    hole: { ...defaultSetup.hole, ...hole },
    camera: { ...defaultSetup.camera, ...camera },
    disk: disk === null ? null : { ...defaultSetup.disk!, ...disk },
    sky: { ...defaultSetup.sky, starStops: 6, ...sky },
    time: { ...defaultSetup.time, last: defaultSetup.time.first + frames - 1 },
    picture: { ...defaultSetup.picture, exposureStops: -0.7, ...filmRaster, ...picture },
  };
}

function domeSetup(change: Change): Setup {
  const film = filmSetup({ ...change, picture: { ...domeRaster, ...change.picture } });
  const lens = { kind: "dome", fieldDeg: 180, tiltDeg: 0 } as const;
  const time = { rate: { numerator: 30, denominator: 1 }, first: 1, last: change.frames ?? 2 };
  return { ...film, camera: { ...film.camera, lens }, time };
}

const wide = { kind: "rectilinear", horizontalFieldDeg: 50 } as const;
const long = { kind: "rectilinear", horizontalFieldDeg: 28 } as const;

export const productions: StoryProduction[] = [
  {
    code: "SM",
    name: "The Salt Meridian",
    kind: "film",
    sequences: [
      {
        number: 1,
        name: "Landfall",
        shots: [
          {
            code: "SM-010",
            brief: "Far off: a thin plate of light with a hole in it.",
            dueInDays: -6,
            fate: "received",
            setup: filmSetup({
              camera: { radius: 90, inclinationDeg: 83, lens: long },
              picture: { exposureStops: 0.5 },
            }),
            words: "The second image under the plate and the shifted dark are as they should be.",
          },
          {
            code: "SM-020",
            brief: "The far side of the plate stands up over the dark.",
            dueInDays: 4,
            fate: "in review",
            setup: filmSetup({
              hole: { spin: 0.9 },
              camera: { radius: 34, lens: wide },
              disk: { outerEdge: 14 },
            }),
            words: "Please look at the inner bright edge: is it the first image all the way round?",
          },
          {
            code: "SM-030",
            brief: "From above: the whole plate, nothing hidden.",
            dueInDays: -2,
            fate: "returned",
            setup: filmSetup({ camera: { inclinationDeg: 30, radius: 45 } }),
            words: "The brief says the tender is in the plane; this camera is sixty degrees above it.",
          },
          {
            code: "SM-040",
            brief: "Level with the plate, for one breath.",
            dueInDays: 8,
            fate: "rendering",
            setup: filmSetup({ hole: { spin: 0.8 }, camera: { inclinationDeg: 89, radius: 26 }, frames: 8 }),
          },
          {
            code: "SM-050",
            brief: "Straight down the axis.",
            dueInDays: 1,
            fate: "delivered",
            setup: filmSetup({ hole: { spin: 0.9 }, camera: { inclinationDeg: 4, radius: 40 } }),
            words: "Seen along the axis the dark is round, as Bardeen's curve has it. Nothing to add.",
          },
        ],
      },
      {
        number: 2,
        name: "The lee side",
        shots: [
          {
            code: "SM-060",
            brief: "Close pass, the bright side near.",
            dueInDays: 3,
            fate: "signed off",
            setup: filmSetup({
              hole: { spin: 0.9 },
              camera: {
                observer: "zero-angular-momentum",
                radius: 12,
                inclinationDeg: 78,
                yawDeg: -6,
                lens: { ...wide, horizontalFieldDeg: 75 },
              },
              disk: { outerEdge: 11 },
              picture: { exposureStops: -0.5 },
            }),
            words:
              "The flattened edge, the offset of the dark and the brighter approaching side are as physics has them.",
          },
          {
            code: "SM-070",
            brief: "A faster hole; its left edge flattens.",
            dueInDays: 11,
            fate: "ready",
            setup: filmSetup({
              hole: { spin: 0.998 },
              camera: { inclinationDeg: 86, radius: 30, lens: long },
              disk: { outerEdge: 12 },
            }),
          },
          {
            code: "SM-080",
            brief: "The tender lets go and falls.",
            dueInDays: 16,
            fate: "open",
            setup: filmSetup({
              hole: { massSolar: 2e4, spin: 0.6 },
              camera: { observer: "falling", radius: 30, inclinationDeg: 75 },
              frames: 48,
            }),
          },
          {
            code: "SM-090",
            brief: "A second hole, seen from the relay.",
            dueInDays: 20,
            fate: "on hold",
            setup: filmSetup({ hole: { spin: 0.3 }, camera: { inclinationDeg: 65 } }),
          },
          {
            code: "SM-100",
            brief: "Other ending, wide.",
            dueInDays: 20,
            fate: "omitted",
            setup: filmSetup({}),
          },
          {
            code: "SM-110",
            brief: "The relay turns away, the plate behind it.",
            dueInDays: 13,
            fate: "stopped",
            setup: filmSetup({
              hole: { spin: 0.7 },
              camera: { inclinationDeg: 100, radius: 28, rollDeg: 12 },
              frames: 6,
            }),
          },
        ],
      },
    ],
  },
  {
    code: "WC",
    name: "Where Clocks Lean",
    kind: "dome",
    sequences: [
      {
        number: 1,
        name: "Overhead",
        shots: [
          {
            code: "WC-010",
            brief: "No disk: the stars alone, and what is missing from them.",
            dueInDays: -1,
            fate: "refused",
            setup: domeSetup({
              hole: { spin: 0 },
              camera: { radius: 15, inclinationDeg: 60, pitchDeg: -50 },
              disk: null,
              sky: { starStops: 8 },
            }),
            words: "Nothing but bent starlight; the dark has the size Synge gives for this distance.",
          },
          {
            code: "WC-020",
            brief: "Round once with the plate, the hole overhead.",
            dueInDays: 9,
            fate: "in review",
            setup: domeSetup({
              hole: { massSolar: 2e4, spin: 0.5 },
              camera: { observer: "circular-orbit", radius: 24, inclinationDeg: 90, pitchDeg: -40 },
              disk: { outerEdge: 16 },
            }),
            words: "One frame in thirty is here; the move is the camera's own orbit, nothing keyed.",
          },
          {
            code: "WC-030",
            brief: "The audience is lowered toward the plate.",
            dueInDays: 18,
            fate: "open",
            setup: domeSetup({ hole: { spin: 0.6 }, camera: { pitchDeg: -30 } }),
          },
        ],
      },
    ],
  },
];
