// An OpenEXR reader for the tests, written from the file layout document and apart from the writer: scanline parts,
// half channels, no compression or ZIP, through Node's own zlib.
import { inflateSync } from "node:zlib";

export interface ReadExr {
  width: number;
  height: number;
  /** Attribute type and raw value by name. */
  attributes: Map<string, { type: string; value: Buffer }>;
  channels: Map<string, Float32Array>;
}

export function readExr(file: Uint8Array): ReadExr {
  const bytes = Buffer.from(file);
  if (bytes.readUInt32LE(0) !== 20000630) throw new Error("not OpenEXR");
  if (bytes.readUInt32LE(4) !== 2) throw new Error("not a plain scanline file");
  let at = 8;
  const word = () => {
    const end = bytes.indexOf(0, at);
    const text = bytes.toString("latin1", at, end);
    at = end + 1;
    return text;
  };
  const attributes: ReadExr["attributes"] = new Map();
  while (bytes[at] !== 0) {
    const [name, type] = [word(), word()];
    const size = bytes.readInt32LE(at);
    attributes.set(name, { type, value: bytes.subarray(at + 4, at + 4 + size) });
    at += 4 + size;
  }
  at += 1;

  const box = attributes.get("dataWindow")!.value;
  const width = box.readInt32LE(8) - box.readInt32LE(0) + 1;
  const height = box.readInt32LE(12) - box.readInt32LE(4) + 1;
  const names = channelNames(attributes.get("channels")!.value);
  const channels = new Map(names.map((name) => [name, new Float32Array(width * height)]));
  for (let chunk = 0; chunk < Math.ceil(height / 16); chunk++) {
    const start = Number(bytes.readBigUInt64LE(at + 8 * chunk));
    const y0 = bytes.readInt32LE(start);
    const lines = Math.min(16, height - y0);
    const data = bytes.subarray(start + 8, start + 8 + bytes.readInt32LE(start + 4));
    unpack(expand(data, lines * width * names.length * 2), y0, lines, width, channels);
  }
  return { width, height, attributes, channels };
}

function channelNames(list: Buffer): string[] {
  const names: string[] = [];
  for (let at = 0; list[at] !== 0;) {
    const end = list.indexOf(0, at);
    names.push(list.toString("latin1", at, end));
    if (list.readInt32LE(end + 1) !== 1) throw new Error("not a half channel");
    at = end + 17;
  }
  return names;
}

function expand(data: Buffer, length: number): Buffer {
  if (data.length === length) return data;
  const differences = inflateSync(data);
  for (let i = 1; i < differences.length; i++)
    differences[i] = (differences[i - 1]! + differences[i]! - 128) & 255;
  const raw = Buffer.alloc(length);
  const half = Math.ceil(length / 2);
  for (let i = 0; i < length; i++) raw[i] = differences[i % 2 ? half + (i - 1) / 2 : i / 2]!;
  return raw;
}

function unpack(raw: Buffer, y0: number, lines: number, width: number, channels: ReadExr["channels"]) {
  let at = 0;
  for (let y = y0; y < y0 + lines; y++)
    for (const plane of channels.values())
      for (let x = 0; x < width; x++, at += 2) plane[y * width + x] = halfValue(raw.readUInt16LE(at));
}

/** The value of a half, straight from IEEE 754's definition. */
export function halfValue(bits: number): number {
  const sign = bits & 0x8000 ? -1 : 1;
  const exponent = (bits >> 10) & 31;
  const fraction = bits & 1023;
  if (exponent === 31) return fraction ? NaN : sign * Infinity;
  return sign * (exponent ? 2 ** (exponent - 15) * (1 + fraction / 1024) : 2 ** -24 * fraction);
}
