// A 16-bit RGB PNG tagged as sRGB (PNG third edition, 2025). Written here because pngjs cannot tag colour and the PNG
// libraries at hand deflate with the machine's zlib; fflate's bytes are the same everywhere.
import { zlibSync } from "fflate";
import { joinBytes } from "./exr-attributes";

const signature = Uint8Array.of(0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a);
const upFilter = 2;

const crcTable = Uint32Array.from({ length: 256 }, (_, n) => {
  for (let k = 0; k < 8; k++) n = n & 1 ? 0xedb88320 ^ (n >>> 1) : n >>> 1;
  return n;
});

function crc32(bytes: Uint8Array): number {
  let crc = 0xffffffff;
  for (const byte of bytes) crc = crcTable[(crc ^ byte) & 0xff]! ^ (crc >>> 8);
  return ~crc >>> 0;
}

function chunk(name: string, data: Uint8Array): Uint8Array {
  const body = joinBytes([new TextEncoder().encode(name), data]);
  return joinBytes([bigEndian(data.length), body, bigEndian(crc32(body))]);
}

const bigEndian = (...values: number[]) =>
  Uint8Array.from(
    values.flatMap((value) => [value >>> 24, value >>> 16, value >>> 8, value].map((byte) => byte & 0xff)),
  );

/** The file's bytes from 16-bit sRGB codes, three a pixel, rows from the top. */
export function encodePng(width: number, height: number, codes: Uint16Array): Uint8Array {
  const stride = 6 * width;
  const rows = new Uint8Array((stride + 1) * height);
  for (let y = 0; y < height; y++) {
    rows[y * (stride + 1)] = upFilter;
    filterRow(codes, 3 * width, y, rows, y * (stride + 1) + 1);
  }
  return joinBytes([
    signature,
    chunk("IHDR", joinBytes([bigEndian(width, height), Uint8Array.of(16, 2, 0, 0, 0)])),
    // cICP: BT.709 primaries, sRGB transfer, RGB, full range; sRGB and gAMA for readers that do not know it.
    chunk("cICP", Uint8Array.of(1, 13, 0, 1)),
    chunk("sRGB", Uint8Array.of(1)),
    chunk("gAMA", bigEndian(45455)),
    chunk("IDAT", zlibSync(rows, { level: 6 })),
    chunk("IEND", new Uint8Array(0)),
  ]);
}

/** Each byte less the one above it. */
function filterRow(codes: Uint16Array, perRow: number, y: number, rows: Uint8Array, at: number): void {
  for (let i = 0; i < perRow; i++) {
    const code = codes[y * perRow + i]!;
    const above = y === 0 ? 0 : codes[(y - 1) * perRow + i]!;
    rows[at + 2 * i] = (code >>> 8) - (above >>> 8);
    rows[at + 2 * i + 1] = (code & 0xff) - (above & 0xff);
  }
}
