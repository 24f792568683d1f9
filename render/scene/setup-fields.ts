// The setup's fields, each with its range: everything a shot's picture follows from. Units are in the names or stated
// here; radii are in M = GM/c².
import { z } from "zod";

const figure = (value: number) => value.toLocaleString("en", { maximumFractionDigits: 6 });

const between = (low: number, high: number, unit = "") => {
  const spaced = unit === "" || unit === "°" ? unit : ` ${unit}`;
  const range = `between ${figure(low)} and ${figure(high)}${spaced}`;
  return z
    .number({ error: `A number ${range}.` })
    .min(low, `Must be ${range}.`)
    .max(high, `Must be ${range}.`);
};

const wholeBetween = (low: number, high: number, unit = "") =>
  between(low, high, unit).int("Must be a whole number.");

export const observerKinds = ["held", "zero-angular-momentum", "circular-orbit", "falling"] as const;
export type ObserverKind = (typeof observerKinds)[number];

const lensSchema = z.discriminatedUnion("kind", [
  z.strictObject({ kind: z.literal("rectilinear"), horizontalFieldDeg: between(5, 170, "°") }),
  z.strictObject({ kind: z.literal("dome"), fieldDeg: between(180, 220, "°"), tiltDeg: between(0, 45, "°") }),
  z.strictObject({ kind: z.literal("panorama") }),
]);

const diskSchema = z.strictObject({
  sense: z.enum(["prograde", "retrograde"]),
  innerEdge: z.union([z.literal("isco"), between(1, 1000, "M")], {
    error: 'A radius in M, or "isco" for the innermost stable orbit.',
  }),
  outerEdge: between(1, 1000, "M"),
  peakTemperatureK: between(1e3, 1e7, "K"),
});

const skySchema = z.strictObject({
  kind: z.enum(["stars", "dark"]),
  poleRaDeg: between(0, 360, "°"),
  poleDecDeg: between(-90, 90, "°"),
  turnDeg: between(-180, 180, "°"),
  starStops: between(-20, 20, "stops"),
});

/** The frame rates of FIELD §2, as rationals so that none is rounded. */
export const frameRates = [
  [24, 1],
  [25, 1],
  [30, 1],
  [48, 1],
  [60, 1],
  [24000, 1001],
  [30000, 1001],
  [60000, 1001],
] as const;

const rateSchema = z
  .strictObject({ numerator: z.number().int(), denominator: z.number().int() })
  .refine((rate) => frameRates.some(([n, d]) => n === rate.numerator && d === rate.denominator), {
    error: "Must be 24, 25, 30, 48, 60, 24000/1001, 30000/1001 or 60000/1001 frames a second.",
  });

export const maximumFrames = 20_000;

export const setupFields = z.strictObject({
  schema: z.literal(1, { error: "This program reads setups of schema 1." }),
  hole: z.strictObject({ massSolar: between(3, 2e10, "solar masses"), spin: between(0, 0.9999) }),
  camera: z.strictObject({
    observer: z.enum(observerKinds),
    radius: between(1, 1e6, "M"),
    inclinationDeg: between(0, 180, "°"),
    yawDeg: between(-180, 180, "°"),
    pitchDeg: between(-90, 90, "°"),
    rollDeg: between(-180, 180, "°"),
    lens: lensSchema,
  }),
  disk: diskSchema.nullable(),
  sky: skySchema,
  time: z.strictObject({
    rate: rateSchema,
    first: wholeBetween(0, 999_999),
    last: wholeBetween(0, 999_999),
  }),
  picture: z.strictObject({
    width: wholeBetween(16, 8192, "pixels"),
    height: wholeBetween(16, 8192, "pixels"),
    exposureStops: between(-20, 20, "stops"),
  }),
});

export type Setup = z.infer<typeof setupFields>;
export type Lens = Setup["camera"]["lens"];
export type Disk = NonNullable<Setup["disk"]>;
