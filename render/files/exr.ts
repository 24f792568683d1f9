// A scanline OpenEXR file, ZIP-compressed half-float RGBA. fflate's deflate gives the same bytes on any machine.
import { zlibSync } from "fflate";
import { encodeHeader, int32s, joinBytes, type ExrHeader } from "./exr-attributes";
import { halfBits } from "./half-float";

const magicAndVersion = int32s(20000630, 2);
const zipCompression = 3;
const linesPerChunk = 16;
// Stored in alphabetical order, as the format demands; the numbers are their places in RGBA.
const channels = [
  ["A", 3],
  ["B", 2],
  ["G", 1],
  ["R", 0],
] as const;

export interface ExrPicture {
  width: number;
  height: number;
  /** Four floats a pixel, premultiplied, rows from the top. */
  rgba: Float32Array;
}

/** The file's bytes; `attributes` follow the ones the format requires. */
export function encodeExr(picture: ExrPicture, attributes: ExrHeader): Uint8Array {
  const { width, height } = picture;
  const window = [0, 0, width - 1, height - 1] as const;
  const header = encodeHeader({
    channels: { type: "chlist", value: channels.map(([name]) => name) },
    compression: { type: "compression", value: zipCompression },
    dataWindow: { type: "box2i", value: window },
    displayWindow: { type: "box2i", value: window },
    lineOrder: { type: "lineOrder", value: 0 },
    pixelAspectRatio: { type: "float", value: 1 },
    screenWindowCenter: { type: "v2f", value: [0, 0] },
    screenWindowWidth: { type: "float", value: 1 },
    ...attributes,
  });

  const chunks: Uint8Array[] = [];
  for (let y = 0; y < height; y += linesPerChunk) {
    const data = compress(packLines(picture, y, Math.min(height, y + linesPerChunk)));
    chunks.push(joinBytes([int32s(y, data.length), data]));
  }
  const offsets = new BigUint64Array(chunks.length);
  let at = magicAndVersion.length + header.length + offsets.byteLength;
  chunks.forEach((chunk, i) => {
    offsets[i] = BigInt(at);
    at += chunk.length;
  });
  return joinBytes([magicAndVersion, header, new Uint8Array(offsets.buffer), ...chunks]);
}

/** Lines y0 to y1, each as its A, B, G and R rows of halves. */
function packLines({ width, rgba }: ExrPicture, y0: number, y1: number): Uint8Array {
  const bytes = new Uint8Array((y1 - y0) * width * channels.length * 2);
  let at = 0;
  for (let y = y0; y < y1; y++)
    for (const [, channel] of channels)
      for (let i = 4 * y * width + channel; i < 4 * (y + 1) * width; i += 4) {
        const half = halfBits(rgba[i]!);
        bytes[at++] = half & 0xff;
        bytes[at++] = half >>> 8;
      }
  return bytes;
}

/** OpenEXR's ZIP: even bytes before odd ones, each the difference from the last, deflated; raw where that is no shorter. */
function compress(raw: Uint8Array): Uint8Array {
  const split = new Uint8Array(raw.length);
  const middle = (raw.length + 1) >> 1;
  for (let i = 0; i < raw.length; i++) split[(i & 1 ? middle : 0) + (i >> 1)] = raw[i]!;
  for (let i = split.length - 1; i > 0; i--) split[i] = split[i]! - split[i - 1]! + 128;
  const deflated = zlibSync(split, { level: 6 });
  return deflated.length < raw.length ? deflated : raw;
}
