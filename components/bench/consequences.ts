// What follows from a setup's values, in a line each. A value that is not there yet, or cannot be, has no consequence.
import {
  accretionForPeakTemperature,
  eddingtonRate,
  peakTemperatureForAccretion,
} from "@/render/emission/thin-disk";
import type { Disk, Setup } from "@/render/scene/setup";
import { clockRate, properAccelerationInSi } from "@/render/spacetime/clocks";
import { createCamera } from "@/render/spacetime/observers";
import {
  circularOmega,
  ergosurface,
  horizonAngularVelocity,
  iscoRadius,
  outerHorizon,
} from "@/render/spacetime/orbits";
import { lengthInKm, solarMassesToKg, timeInSeconds } from "@/render/units";
import { figures, scientific, sayGravity, sayLength, sayTime } from "./quantities";

export type Consequences = Record<ConsequenceName, string>;
type ConsequenceName = keyof typeof sentences;

const year = 31_557_600;
const cosOf = (degrees: number) => Math.cos((degrees * Math.PI) / 180);
const senseOf = ({ disk }: Setup) => disk?.sense ?? "prograde";

/** Seconds of one circular orbit, by a clock far away. */
const orbitSeconds = ({ hole, disk }: Setup, r: number) =>
  timeInSeconds(
    hole.massSolar,
    (2 * Math.PI) / Math.abs(circularOmega(hole.spin, r, disk?.sense ?? "prograde")),
  );

const innerRadius = (setup: Setup): number => {
  const edge = setup.disk?.innerEdge ?? "isco";
  return edge === "isco" ? iscoRadius(setup.hole.spin, senseOf(setup)) : edge;
};

const accretionOf = ({ massSolar, spin }: Setup["hole"], { sense, peakTemperatureK }: Disk) =>
  accretionForPeakTemperature(massSolar, spin, sense, peakTemperatureK);

const screenSeconds = ({ time }: Setup) =>
  ((time.last - time.first + 1) * time.rate.denominator) / time.rate.numerator;

/** "24", or "23.976" of 24000/1001. */
export const sayRate = ({ numerator, denominator }: Setup["time"]["rate"]): string =>
  String(Number((numerator / denominator).toFixed(3)));

const sentences = {
  mass: ({ hole }: Setup) =>
    `${scientific(hole.massSolar)}; light crosses 1 M in ${sayTime(timeInSeconds(hole.massSolar, 1))}`,
  spin: ({ hole }: Setup) =>
    `horizon at ${outerHorizon(hole.spin).toFixed(3)} M, ` +
    (hole.spin === 0
      ? "not turning"
      : `turns in ${sayTime(timeInSeconds(hole.massSolar, (2 * Math.PI) / horizonAngularVelocity(hole.spin)))}`),
  observer: ({ hole, camera }: Setup) => {
    if (camera.observer === "held")
      return `allowed beyond ${ergosurface(hole.spin, cosOf(camera.inclinationDeg)).toFixed(3)} M here`;
    return `allowed beyond ${outerHorizon(hole.spin).toFixed(3)} M`;
  },
  radius: (setup: Setup) => {
    const { hole, camera } = setup;
    const { observer, radius } = camera;
    const cosTheta = cosOf(camera.inclinationDeg);
    const clock = clockRate(createCamera(observer, hole.spin, radius, cosTheta, senseOf(setup)));
    const pull = properAccelerationInSi(hole.massSolar, observer, hole.spin, radius, cosTheta);
    const weight = pull > 0 ? `, ${sayGravity(pull)} to stay` : ", weightless";
    return `${sayLength(lengthInKm(hole.massSolar, radius))}; clock ${clock.toFixed(3)}${weight}`;
  },
  field: ({ camera }: Setup) => {
    if (camera.lens.kind !== "rectilinear") return "";
    const focal = 18 / Math.tan((camera.lens.horizontalFieldDeg * Math.PI) / 360);
    return `${figures(focal)} mm on a 36 mm width`;
  },
  innerEdge: (setup: Setup) =>
    `innermost stable orbit ${iscoRadius(setup.hole.spin, senseOf(setup)).toFixed(3)} M; one orbit ${sayTime(orbitSeconds(setup, innerRadius(setup)))}`,
  outerEdge: (setup: Setup) => {
    const { hole, disk } = setup;
    if (!disk) return "";
    return `${sayLength(lengthInKm(hole.massSolar, disk.outerEdge))}; one orbit ${sayTime(orbitSeconds(setup, disk.outerEdge))}`;
  },
  peakTemperature: ({ hole, disk }: Setup) => {
    if (!disk) return "";
    const tenth = 0.1 * eddingtonRate(hole.massSolar, hole.spin, disk.sense);
    const expected = peakTemperatureForAccretion(hole.massSolar, hole.spin, disk.sense, tenth);
    return `a 10 % Eddington disk: ${figures(expected)} K`;
  },
  /** The accretion rate the temperature implies, in solar masses a year. */
  accretion: ({ hole, disk }: Setup) =>
    disk ? figures((accretionOf(hole, disk) * year) / solarMassesToKg(1)) : "",
  eddington: ({ hole, disk }: Setup) => {
    if (!disk) return "";
    const share = accretionOf(hole, disk) / eddingtonRate(hole.massSolar, hole.spin, disk.sense);
    return `${figures(100 * share)} % of the Eddington rate`;
  },
  format: ({ picture, time }: Setup) =>
    `${(picture.width / picture.height).toFixed(2)} to 1, ${figures((picture.width * picture.height) / 1e6)} million pixels, ${sayRate(time.rate)} frames a second`,
  exposure: ({ picture }: Setup) => `light × ${figures(2 ** picture.exposureStops)}, fixed for the shot`,
  stars: ({ sky }: Setup) =>
    sky.starStops === 0 ? "as bright as catalogued" : `light × ${figures(2 ** sky.starStops)}`,
  frames: (setup: Setup) => {
    const count = setup.time.last - setup.time.first + 1;
    return `${count} ${count === 1 ? "frame" : "frames"}, ${figures(screenSeconds(setup))} s of screen`;
  },
  turns: (setup: Setup) =>
    setup.disk
      ? `the inner edge turns ${figures(screenSeconds(setup) / orbitSeconds(setup, innerRadius(setup)))} times meanwhile`
      : "",
};

/** Every line that can be said of these values, which need not be a whole setup yet. */
export function sayConsequences(values: Setup): Consequences {
  const say = (sentence: (setup: Setup) => string): string => {
    try {
      const words = sentence(values);
      return /NaN|Infinity|∞/.test(words) ? "" : words;
    } catch {
      // The camera cannot be there; the field itself says why.
      return "";
    }
  };
  const entries = Object.entries(sentences).map(([name, sentence]) => [name, say(sentence)]);
  return Object.fromEntries(entries) as Consequences;
}
