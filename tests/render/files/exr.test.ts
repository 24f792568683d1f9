import { execFileSync } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, describe, expect, it } from "vitest";
import { encodeExr } from "@/render/files/exr";
import { readExr } from "./read-exr";

const folder = mkdtempSync(path.join(tmpdir(), "exr-"));
afterAll(() => rmSync(folder, { recursive: true }));

function picture(width: number, height: number, value: (i: number) => number) {
  return { width, height, rgba: Float32Array.from({ length: 4 * width * height }, (_, i) => value(i)) };
}

// A smooth ramp compresses; the second is too unruly to, and so is stored raw.
const smooth = picture(37, 21, (i) => i / 1024);
const unruly = picture(5, 3, (i) => Math.fround(((i * 7919) % 104729) / 13));

describe("OpenEXR files", () => {
  it.each([
    ["smooth", smooth],
    ["unruly", unruly],
  ] as const)("a %s picture comes back from a reader that shares nothing with the writer", (_, given) => {
    const read = readExr(encodeExr(given, {}));
    expect([read.width, read.height]).toEqual([given.width, given.height]);
    ["R", "G", "B", "A"].forEach((name, channel) => {
      read.channels.get(name)!.forEach((value, i) => {
        const original = given.rgba[4 * i + channel]!;
        expect(Math.abs(value - original)).toBeLessThanOrEqual(Math.abs(original) * 2 ** -11 + 2 ** -25);
      });
    });
  });

  it("are the same bytes every time", () => {
    expect(Buffer.compare(encodeExr(smooth, {}), encodeExr(smooth, {}))).toBe(0);
  });

  it("carry every attribute as Debian's exrheader reads it", () => {
    const file = path.join(folder, "attributes.exr");
    const attributes = {
      comments: { type: "string", value: "a comment" },
      framesPerSecond: { type: "rational", value: [24000, 1001] },
      imageCounter: { type: "int", value: 1001 },
      envmap: { type: "envmap", value: 0 },
      "ringwright:spin": { type: "double", value: 0.998 },
    } as const;
    writeFileSync(file, encodeExr(smooth, attributes));
    const header = execFileSync("exrheader", [file], { encoding: "utf8" });
    expect(header).toContain('comments (type string): "a comment"');
    expect(header).toMatch(/framesPerSecond \(type rational\): 24000\/1001/);
    expect(header).toContain("imageCounter (type int): 1001");
    expect(header).toContain("latitude-longitude map");
    expect(header).toContain("ringwright:spin (type double): 0.998");
    expect(header).toMatch(/compression \(type compression\): zip, multi-scanline blocks/);
    expect(header).toContain("dataWindow (type box2i): (0 0) - (36 20)");
    for (const channel of "RGBA") expect(header).toContain(`${channel}, 16-bit floating-point, sampling 1 1`);
  });

  it("refuse an attribute name longer than the format's 31 letters", () => {
    expect(() => encodeExr(smooth, { ["x".repeat(32)]: { type: "int", value: 0 } })).toThrow(RangeError);
  });
});
