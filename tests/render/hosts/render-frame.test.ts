import { existsSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { PNG } from "pngjs";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { buildSky } from "@/lib/local/build-sky";
import { halfBits } from "@/render/files/half-float";
import type { FrameRequest } from "@/render/hosts/node/frame-request";
import { closePool } from "@/render/hosts/node/pool";
import { renderFrame } from "@/render/hosts/node/render-frame";
import { apply, primaries, rgbToRgb, type Triple } from "@/render/shade/colour-spaces";
import { planFrame } from "@/render/shade/frame-plan";
import { renderTile } from "@/render/shade/render-tile";
import { encodeSrgb } from "@/render/shade/transfer";
import { halfValue, readExr } from "../files/read-exr";
import { smallSetup } from "../shade/small-setup";

const sky = fileURLToPath(new URL("../../../public/sky", import.meta.url));
beforeAll(async () => {
  if (!existsSync(`${sky}/stars.bin`)) await buildSky(sky);
});
afterAll(closePool);

const request = (changes: Partial<FrameRequest> = {}): FrameRequest => ({
  frame: 1001,
  quality: "proof",
  colourSpace: "rec709",
  setupDigest: "d1".repeat(32),
  kernelVersion: "test",
  ...changes,
});

const setup = smallSetup({ picture: { exposureStops: -1 } });
const bytes = (file: Uint8Array) => Buffer.from(file);

describe("a frame from the thread pool", () => {
  it("has, in its OpenEXR file, the very pixels that one thread makes of it", async () => {
    const { exr, stats } = await renderFrame(setup, request());
    const { width, height } = setup.picture;
    const { rgba } = renderTile(planFrame(setup, 1001, "proof", "rec709", null), 0, height);
    const read = readExr(exr);
    "RGBA".split("").forEach((name, channel) => {
      const plane = read.channels.get(name)!;
      for (let i = 0; i < width * height; i++)
        expect(plane[i]).toBe(halfValue(halfBits(rgba[4 * i + channel]!)));
    });
    expect(stats).toMatchObject({ paths: width * height, unresolved: 0 });
    expect(stats.seconds).toBeGreaterThan(0);
  });

  it("has, in its PNG, the sRGB codes of the same pixels", async () => {
    const { png } = await renderFrame(setup, request());
    const { rgba } = renderTile(planFrame(setup, 1001, "proof", "rec709", null), 0, setup.picture.height);
    const read = PNG.sync.read(bytes(png), { skipRescale: true } as object);
    rgba.forEach((value, i) => {
      if (i % 4 === 3) return;
      const code = Math.round(65535 * encodeSrgb(Math.max(0, Math.min(1, value))));
      expect(read.data[i]).toBe(code);
    });
  });

  it("is the same bytes when rendered again, and says so whatever else is rendered at the same time", async () => {
    const other = smallSetup({ camera: { inclinationDeg: 30 } });
    const [first, , second] = await Promise.all([
      renderFrame(setup, request({ quality: "master" })),
      renderFrame(other, request()),
      renderFrame(setup, request({ quality: "master" })),
    ]);
    expect(bytes(first.exr).equals(bytes(second.exr))).toBe(true);
    expect(bytes(first.png).equals(bytes(second.png))).toBe(true);
    expect(first.stats.paths).toBe(4 * 96 * 54);
  });

  it("shows one picture in both colour spaces", async () => {
    const planes = async (colourSpace: "rec709" | "acescg") => {
      const { channels } = readExr((await renderFrame(setup, request({ colourSpace }))).exr);
      return (i: number): Triple => [channels.get("R")![i]!, channels.get("G")![i]!, channels.get("B")![i]!];
    };
    const [rec709, acescg] = [await planes("rec709"), await planes("acescg")];
    const toAcescg = rgbToRgb(primaries.rec709, primaries.acescg);
    for (let i = 0; i < 96 * 54; i += 7)
      apply(toAcescg, rec709(i)).forEach((value, k) =>
        expect(Math.abs(value - acescg(i)[k]!)).toBeLessThanOrEqual(2e-3 * Math.max(...acescg(i)) + 1e-6),
      );
    const [a, b] = await Promise.all([
      renderFrame(setup, request({ colourSpace: "rec709" })),
      renderFrame(setup, request({ colourSpace: "acescg" })),
    ]);
    const [one, two] = [a, b].map(
      ({ png }) => PNG.sync.read(bytes(png), { skipRescale: true } as object).data,
    );
    one!.forEach((code, i) => expect(Math.abs(code - two![i]!)).toBeLessThanOrEqual(2));
  });

  it("carries the facts of its setup, and no date", async () => {
    const { exr } = await renderFrame(setup, request({ colourSpace: "acescg" }));
    const { attributes } = readExr(exr);
    const text = (name: string) => attributes.get(name)!.value.toString();
    const double = (name: string) => attributes.get(name)!.value.readDoubleLE();
    expect(text("ringwright:setupDigest")).toBe("d1".repeat(32));
    expect(text("ringwright:kernel")).toBe("test");
    expect(JSON.parse(text("ringwright:camera"))).toEqual(setup.camera);
    expect([double("ringwright:massSolar"), double("ringwright:spin")]).toEqual([4e7, 0.6]);
    expect(attributes.get("imageCounter")!.value.readInt32LE()).toBe(1001);
    const rate = attributes.get("framesPerSecond")!.value;
    expect([rate.readInt32LE(0), rate.readUInt32LE(4)]).toEqual([24, 1]);
    // AP1 and its white, Academy S-2014-004.
    const chromaticities = attributes.get("chromaticities")!.value;
    [0.713, 0.293, 0.165, 0.83, 0.128, 0.044, 0.32168, 0.33767].forEach((value, i) =>
      expect(chromaticities.readFloatLE(4 * i)).toBeCloseTo(value, 6),
    );
    for (const name of ["capDate", "whiteLuminance", "envmap", "utcOffset"])
      expect(attributes.has(name)).toBe(false);
  });

  it("marks a panorama as a latitude-longitude map", async () => {
    const panorama = smallSetup({
      camera: { lens: { kind: "panorama" } },
      picture: { width: 64, height: 32 },
    });
    const { exr } = await renderFrame(panorama, request());
    expect([...readExr(exr).attributes.get("envmap")!.value]).toEqual([0]);
  });

  it("draws stars from the catalogue that the sky's build step made", async () => {
    const stars = smallSetup({ disk: null, sky: { kind: "stars", starStops: 4 } });
    const { exr } = await renderFrame(stars, request());
    const green = readExr(exr).channels.get("G")!;
    expect(green.filter((value) => value > 0.001).length).toBeGreaterThan(20);
  });

  it("compresses highlights in the PNG alone when a display curve is asked for", async () => {
    const bright = smallSetup({ picture: { exposureStops: 4 } });
    const plain = await renderFrame(bright, request());
    const curved = await renderFrame(bright, request({ displayCurve: "reinhard" }));
    expect(bytes(plain.exr).equals(bytes(curved.exr))).toBe(true);
    const whites = (png: Uint8Array) =>
      PNG.sync.read(bytes(png), { skipRescale: true } as object).data.filter((code) => code === 65535).length;
    expect(whites(curved.png)).toBeLessThan(whites(plain.png) - 96 * 54);
  });
});

describe("a frame that cannot be", () => {
  it("tells progress that never goes back, and ends with all of it", async () => {
    const shares: number[] = [];
    await renderFrame(setup, request({ onProgress: (share) => shares.push(share) }));
    expect([...shares].sort((a, b) => a - b)).toEqual(shares);
    expect(shares.at(-1)).toBe(1);
  });

  it("stops mid-way when aborted, with the signal's own reason, and leaves the pool fit for the next", async () => {
    const large = smallSetup({ picture: { width: 2048, height: 1024 } });
    const controller = new AbortController();
    const shares: number[] = [];
    const onProgress = (share: number) => {
      shares.push(share);
      controller.abort(new Error("the version was cancelled"));
    };
    const stopped = renderFrame(large, request({ signal: controller.signal, onProgress }));
    await expect(stopped).rejects.toThrow("the version was cancelled");
    expect(Math.max(...shares)).toBeLessThan(0.5);
    const { stats } = await renderFrame(setup, request());
    expect(stats.paths).toBe(96 * 54);
  });

  it("is not begun when already aborted", async () => {
    const stopped = renderFrame(setup, request({ signal: AbortSignal.abort(new Error("too late")) }));
    await expect(stopped).rejects.toThrow("too late");
  });

  it("is refused in words when the falling camera has reached the horizon", async () => {
    // A small hole, so that a second is long: GM/c³ of three solar masses is 15 µs.
    const valid = smallSetup({
      hole: { massSolar: 3, spin: 0 },
      camera: { observer: "falling", radius: 1000 },
      time: { first: 1, last: 4 },
    });
    await expect(renderFrame(valid, request({ frame: 200 }))).rejects.toThrow(
      "The falling camera is in the horizon at frame 200. End before it, or begin farther out.",
    );
  });
});
