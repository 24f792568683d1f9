import { createHash } from "node:crypto";
import { Blob as NodeBlob } from "node:buffer";
import { buffer } from "node:stream/consumers";
import { ZipFile } from "yazl";
import { beforeAll, describe, expect, it } from "vitest";
import { checkFiles, matchPaths, writeReport, type Found } from "@/components/door/check-files";
import { readZip } from "@/components/door/read-zip";

const contents: Record<string, string> = {
  "README.txt": "how to check",
  "frames/AB-010-v001_1001-1002/png/AB-010-v001.1001.png": "first",
  "frames/AB-010-v001_1001-1002/png/AB-010-v001.1002.png": "second",
};
const wanted = Object.entries(contents).map(([path, body]) => ({
  path,
  sha256: createHash("sha256").update(body).digest("hex"),
  bytes: body.length,
}));
// jsdom's Blob cannot be read; a browser's is as Node's.
const blobOf = (bytes: string | Uint8Array) => new NodeBlob([bytes]) as unknown as Blob;
const check = (
  found: Found[],
  signal = new AbortController().signal,
  onBytes: (bytes: number) => void = () => undefined,
) => checkFiles(wanted, found, { onBytes, signal });

async function pack(options: { compress?: boolean; forceZip64Format?: boolean } = {}): Promise<Buffer> {
  const zip = new ZipFile();
  const { compress = false, forceZip64Format = false } = options;
  for (const [path, body] of Object.entries(contents))
    zip.addBuffer(Buffer.from(body), `AB-delivery-001/${path}`, { compress, forceZip64Format });
  zip.end({ forceZip64Format, comment: "" });
  return buffer(zip.outputStream as NodeJS.ReadableStream & AsyncIterable<Uint8Array>);
}
let archive: Buffer;
beforeAll(async () => {
  archive = await pack();
});

describe("reading an archive where it lies", () => {
  it("finds every file with its bytes, in the plain and in the long form", async () => {
    for (const bytes of [archive, await pack({ forceZip64Format: true })]) {
      const entries = await readZip(blobOf(bytes));
      expect(entries.map(({ path }) => path)).toEqual(
        Object.keys(contents).map((path) => `AB-delivery-001/${path}`),
      );
      for (const { path, content } of entries) expect(await content.text()).toBe(contents[path.slice(16)]);
    }
  });

  it("says that an archive which broke off is not whole", async () => {
    for (const length of [0, 10, archive.length >> 1, archive.length - 30])
      await expect(readZip(blobOf(archive.subarray(0, length)))).rejects.toThrow(/no whole archive/);
  });

  it("says that a compressed archive is not the package as it was delivered", async () => {
    await expect(readZip(blobOf(await pack({ compress: true })))).rejects.toThrow(/is compressed/);
  });
});

describe("checking what arrived", () => {
  it("finds that all files match, and counts their bytes", async () => {
    const told: number[] = [];
    const result = await check(await readZip(blobOf(archive)), undefined, (bytes) => told.push(bytes));
    expect(result).toMatchObject({ matching: Object.keys(contents), different: [], missing: [] });
    expect(told.at(-1)).toBe(wanted.reduce((sum, { bytes }) => sum + bytes, 0));
  });

  it("names a file with one altered byte, and one of another length", async () => {
    const damaged = Buffer.from(archive);
    damaged[damaged.indexOf("second")]! ^= 1;
    expect((await check(await readZip(blobOf(damaged)))).different).toEqual([wanted[2]!.path]);
    const longer = [{ path: "README.txt", content: blobOf("how to check!") }];
    expect(await check(longer)).toMatchObject({
      different: ["README.txt"],
      missing: [wanted[1]!.path, wanted[2]!.path],
    });
  });

  it("finds a file in whatever folder the package was put into, and ignores what is not of it", () => {
    const content = blobOf("first");
    const found = [
      { path: `Desktop/reel one/${wanted[1]!.path}`, content },
      { path: "Desktop/reel one/notes.doc", content },
    ];
    expect([...matchPaths(wanted, found).keys()]).toEqual([wanted[1]!.path]);
  });

  it("ends when it is broken off", async () => {
    const stop = new AbortController();
    stop.abort(new Error("stopped"));
    await expect(check(await readZip(blobOf(archive)), stop.signal)).rejects.toThrow("stopped");
  });

  it("can be kept as a text that names what does not match", () => {
    const report = writeReport("AB-delivery-001", {
      matching: ["a"],
      different: ["b"],
      missing: ["c"],
      bytes: 3,
    });
    expect(report).toContain("as signed 1, not as signed 1, not among the chosen files 1.");
    expect(report).toContain("Not as signed:\n  b");
  });
});
