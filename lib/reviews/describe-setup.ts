// A frozen setup in plain sentences, for the advisor who signs it and the client who reads the science note.
import { iscoRadius } from "@/render/spacetime/orbits";
import type { Setup } from "@/render/scene/setup";

const figure = (value: number, digits = 4) =>
  value.toLocaleString("en", { maximumSignificantDigits: digits });

export function describeSetup(setup: Setup): string[] {
  return [
    describeHole(setup.hole),
    describeCamera(setup.camera),
    describeDisk(setup),
    describeSky(setup.sky),
    describePicture(setup),
  ];
}

export function describeMass(massSolar: number): string {
  if (massSolar >= 1e9) return `${figure(massSolar / 1e9)} thousand million suns`;
  if (massSolar >= 1e6) return `${figure(massSolar / 1e6)} million suns`;
  return `${figure(massSolar)} suns`;
}

const describeHole = ({ massSolar, spin }: Setup["hole"]) =>
  spin === 0
    ? `The hole has the mass of ${describeMass(massSolar)} and does not spin.`
    : `The hole has the mass of ${describeMass(massSolar)} and spin ${figure(spin)} of at most 1.`;

const observers: Record<Setup["camera"]["observer"], string> = {
  held: "held still",
  "zero-angular-momentum": "carried round by the turning space, without angular momentum",
  "circular-orbit": "on a circular orbit",
  falling: "falling in from rest far away",
};

function describeCamera({
  observer,
  radius,
  inclinationDeg,
  lens,
  yawDeg,
  pitchDeg,
  rollDeg,
}: Setup["camera"]): string {
  const turned = [
    [yawDeg, "yaw"],
    [pitchDeg, "pitch"],
    [rollDeg, "roll"],
  ] as const;
  const angles = turned.filter(([angle]) => angle !== 0).map(([angle, name]) => `${name} ${figure(angle)}°`);
  const aim = angles.length > 0 ? `, turned from the hole by ${angles.join(", ")}` : ", aimed at the hole";
  return `The camera is ${observers[observer]} at ${figure(radius)} M from it, ${figure(inclinationDeg)}° from the spin axis${aim}. Its lens is ${describeLens(lens)}.`;
}

function describeLens(lens: Setup["camera"]["lens"]): string {
  if (lens.kind === "rectilinear") return `rectilinear, ${figure(lens.horizontalFieldDeg)}° wide`;
  if (lens.kind === "dome") return `a dome of ${figure(lens.fieldDeg)}°, tilted by ${figure(lens.tiltDeg)}°`;
  return "a full panorama";
}

function describeDisk({ disk, hole }: Setup): string {
  if (!disk) return "There is no disk.";
  const inner =
    disk.innerEdge === "isco"
      ? `the innermost stable orbit, ${figure(iscoRadius(hole.spin, disk.sense))} M,`
      : `${figure(disk.innerEdge)} M`;
  return `The disk reaches from ${inner} to ${figure(disk.outerEdge)} M, turns ${disk.sense === "prograde" ? "with" : "against"} the hole, and is ${figure(disk.peakTemperatureK)} K at its hottest, as its gas sees it.`;
}

function describeSky(sky: Setup["sky"]): string {
  if (sky.kind === "dark") return "The sky is dark.";
  const stops =
    sky.starStops === 0 ? "as bright as catalogued" : `brightened by ${figure(sky.starStops)} stops`;
  return `The sky holds the catalogued stars, ${stops}.`;
}

function describePicture({ picture, time }: Setup): string {
  const { numerator, denominator } = time.rate;
  const rate = denominator === 1 ? `${numerator}` : `${numerator}/${denominator}`;
  return `The picture is ${picture.width} × ${picture.height} at ${rate} frames a second, exposed by ${figure(picture.exposureStops)} stops.`;
}
