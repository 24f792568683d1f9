// npm run speed [-- --json]: what a light path and a frame cost here. Ratios within one run survive a busy machine;
// absolute times do not.
import { parseArgs } from "node:util";
import { createPathRecord, type PathStart } from "../paths/light-path";
import { traceSecondPath } from "../paths/second-path";
import { traceInto } from "../paths/tracer";
import { lensDirection } from "../scene/lenses";
import { defaultSetup, type Setup } from "../scene/setup";
import { createCamera, createReceivedPhoton, receivePhoton } from "../spacetime/observers";
import { kernelVersion } from "../kernel-version";
import { closePool, threads } from "./node/pool";
import { renderFrame } from "./node/render-frame";

const view = { spin: 0.9, radius: 50, cosTheta: 0.5, fieldDeg: 30, across: 120 };
const repeats = 5;
/** The second path takes milliseconds: only so many of the view's paths are traced by it. */
const secondPaths = 24;

/** The paths of a square 30° view at r = 50 M, a = 0.9, 60° from the axis. */
function viewPaths(): PathStart[] {
  const { spin, radius, cosTheta, fieldDeg, across } = view;
  const camera = createCamera("held", spin, radius, cosTheta);
  const lens = { kind: "rectilinear", horizontalFieldDeg: fieldDeg } as const;
  const direction = new Float64Array(3);
  const photon = createReceivedPhoton();
  return Array.from({ length: across * across }, (_, i) => {
    lensDirection(lens, { width: across, height: across }, i % across, Math.floor(i / across), direction);
    receivePhoton(camera, -direction[2]!, -direction[1]!, direction[0]!, photon);
    const { lambda, eta, signPr, signPtheta } = photon;
    return { spin, rObs: radius, cosThetaObs: cosTheta, lambda, eta, signPr, signPtheta };
  });
}

/** Nanoseconds per call, the least of several rounds, so that other work on the machine counts least. */
function nanoseconds(count: number, call: (i: number) => void): number {
  let least = Infinity;
  for (let round = 0; round < repeats; round++) {
    const begun = performance.now();
    for (let i = 0; i < count; i++) call(i);
    least = Math.min(least, performance.now() - begun);
  }
  return (least * 1e6) / count;
}

function measurePaths() {
  const paths = viewPaths();
  const record = createPathRecord();
  const trace = (withTime: boolean) =>
    nanoseconds(paths.length, (i) => traceInto(paths[i]!, record, { withTime }));
  const [withoutTime, withTime] = [trace(false), trace(true)];
  const stride = Math.floor(paths.length / secondPaths);
  const secondPath = nanoseconds(secondPaths, (i) => traceSecondPath(paths[i * stride]!));
  return {
    withoutTime,
    withTime,
    timeRatio: withTime / withoutTime,
    secondPath,
    secondRatio: secondPath / withTime,
  };
}

async function measureFrame() {
  const setup: Setup = { ...defaultSetup, picture: { ...defaultSetup.picture, width: 960, height: 540 } };
  const request = {
    frame: 1001,
    quality: "proof",
    colourSpace: "rec709",
    setupDigest: "",
    kernelVersion,
  } as const;
  const first = await renderFrame(setup, request);
  const second = await renderFrame(setup, request);
  await closePool();
  return {
    threads,
    firstSeconds: first.stats.seconds,
    secondSeconds: second.stats.seconds,
    peakMemoryMB: process.resourceUsage().maxRSS / 1024,
  };
}

const { values } = parseArgs({ options: { json: { type: "boolean", default: false } } });
const path = measurePaths();
const frame = await measureFrame();
if (values.json) console.log(JSON.stringify({ kernelVersion, path, frame }, null, 2));
else
  console.log(
    [
      `Plain tracer (${kernelVersion}), 30° view at r = 50 M, a = 0.9, one thread, all crossings:`,
      `  r, θ, φ      ${path.withoutTime.toFixed(0)} ns a path`,
      `  r, θ, φ, t   ${path.withTime.toFixed(0)} ns a path, ${path.timeRatio.toFixed(2)} times as long`,
      `  second path  ${path.secondPath.toFixed(0)} ns a path (odex), ${path.secondRatio.toFixed(0)} times as long`,
      `A proof frame of 960 × 540, ${frame.threads} threads, files included:`,
      `  first        ${frame.firstSeconds.toFixed(2)} s, with the threads' start`,
      `  second       ${frame.secondSeconds.toFixed(2)} s`,
      `  memory       ${frame.peakMemoryMB.toFixed(0)} MB at most`,
    ].join("\n"),
  );
