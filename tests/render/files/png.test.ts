import { PNG } from "pngjs";
import sharp from "sharp";
import { describe, expect, it } from "vitest";
import { encodePng } from "@/render/files/png";

const [width, height] = [19, 7];
const codes = Uint16Array.from({ length: 3 * width * height }, (_, i) => (i * 48_271) % 65_536);
const file = Buffer.from(encodePng(width, height, codes));

describe("16-bit PNG files", () => {
  it("come back from pngjs code by code", () => {
    const read = PNG.sync.read(file, { skipRescale: true } as object);
    expect([read.width, read.height]).toEqual([width, height]);
    codes.forEach((code, i) => expect(read.data[4 * Math.floor(i / 3) + (i % 3)]).toBe(code));
  });

  it("come back from libvips code by code, as sRGB of 16 bits", async () => {
    const metadata = await sharp(file).metadata();
    expect([metadata.depth, metadata.space, metadata.channels]).toEqual(["ushort", "rgb16", 3]);
    const raw = await sharp(file).toColourspace("rgb16").raw({ depth: "ushort" }).toBuffer();
    expect(new Uint16Array(raw.buffer, raw.byteOffset, raw.length / 2)).toEqual(codes);
  });

  it("say in cICP, sRGB and gAMA that they are sRGB, and hold no date", () => {
    const chunks: string[] = [];
    for (let at = 8; at < file.length; at += 12 + file.readUInt32BE(at))
      chunks.push(file.toString("latin1", at + 4, at + 8));
    expect(chunks).toEqual(["IHDR", "cICP", "sRGB", "gAMA", "IDAT", "IEND"]);
  });
});
