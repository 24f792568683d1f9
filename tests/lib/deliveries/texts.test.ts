import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { composeManifest } from "@/lib/deliveries/compose-documents";
import { framePath } from "@/lib/deliveries/lay-out";
import { parseRange } from "@/lib/deliveries/parse-range";
import { sayBytes } from "@/lib/deliveries/schema-bytes";
import { wrapText } from "@/lib/deliveries/wrap-text";

const run = { shotCode: "LH-020", number: 4, first: 1001, last: 1096 };

describe("where a frame stands in the package", () => {
  it("is by shot or by format, in names of fixed order", () => {
    const naming = { layout: "by shot", separator: ".", digits: 4 } as const;
    expect(framePath(run, 1001, "png", naming)).toBe("frames/LH-020-v004_1001-1096/png/LH-020-v004.1001.png");
    expect(framePath(run, 1001, "exr", { layout: "by format", separator: "_", digits: 5 })).toBe(
      "frames/exr/LH-020-v004_01001-01096/LH-020-v004_01001.exr",
    );
  });

  it("never puts more than 10,000 frames into one folder, whose name bears its range", () => {
    const long = { shotCode: "TW-110", number: 1, first: 1, last: 15_000 };
    const naming = { layout: "by shot", separator: "_", digits: 5 } as const;
    expect(framePath(long, 10_000, "png", naming)).toContain("TW-110-v001_00001-10000/");
    expect(framePath(long, 10_001, "png", naming)).toContain("TW-110-v001_10001-15000/");
  });

  it("sorts as text in the order of the frames, and is plain ASCII without spaces", () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 999_998 }), fc.constantFrom(".", "_"), (frame, separator) => {
        const naming = { layout: "by shot", separator, digits: 6 } as const;
        const range = { ...run, first: frame, last: frame + 1 };
        const [a, b] = [framePath(range, frame, "exr", naming), framePath(range, frame + 1, "exr", naming)];
        expect(a < b).toBe(true);
        expect(a).toMatch(/^[\x21-\x7e]+$/);
      }),
      { seed: 2031 },
    );
  });
});

describe("the manifest", () => {
  it("lists each file once in the order of its path, as sha256sum writes it", () => {
    const files = ["b/2", "a", "B", "b/1"].map((path) => ({
      path,
      sha256: path.padEnd(64, "0").slice(0, 64),
    }));
    const lines = composeManifest(files).split("\n");
    expect(lines.map((line) => line.slice(66))).toEqual(["B", "a", "b/1", "b/2", ""]);
    expect(lines[0]).toBe(`${"B".padEnd(64, "0")}  B`);
  });
});

describe("ranges of bytes (RFC 9110 §14)", () => {
  it.each([
    [null, "whole"],
    ["bytes=0-9", { start: 0, end: 9 }],
    ["bytes=90-", { start: 90, end: 99 }],
    ["bytes=-5", { start: 95, end: 99 }],
    ["bytes=-500", { start: 0, end: 99 }],
    ["bytes=5-1000", { start: 5, end: 99 }],
    ["bytes=100-", "beyond"],
    ["bytes=-0", "beyond"],
    ["bytes=9-5", "whole"],
    ["bytes=-", "whole"],
    ["bytes=0-1,4-5", "whole"],
    ["items=0-1", "whole"],
  ])("%s of a hundred bytes is %o", (header, expected) => {
    expect(parseRange(header, 100)).toEqual(expected);
  });
});

describe("texts", () => {
  it("are wrapped at 78 characters without losing a word", () => {
    fc.assert(
      fc.property(
        fc.array(fc.string({ minLength: 1, maxLength: 20, unit: fc.constantFrom(..."abcdé") })),
        (words) => {
          const wrapped = wrapText(words.join(" "), "  ");
          expect(wrapped.split(/\s+/).filter(Boolean)).toEqual(words);
          for (const line of wrapped.split("\n")) expect(line.length).toBeLessThanOrEqual(78);
        },
      ),
      { seed: 2031 },
    );
  });

  it("tell lengths to three figures in powers of ten", () => {
    expect([0, 1, 999, 1000, 41_300_000_000, 72_440_000, 9_996_000].map(sayBytes)).toEqual([
      "0 bytes",
      "1 byte",
      "999 bytes",
      "1.00 kB",
      "41.3 GB",
      "72.4 MB",
      "10.0 MB",
    ]);
  });
});
