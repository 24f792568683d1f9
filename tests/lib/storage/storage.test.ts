import { createHash } from "node:crypto";
import { appendFile, mkdtemp, readdir, rm, utimes, writeFile } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { Readable } from "node:stream";
import { buffer } from "node:stream/consumers";
import S3rver from "s3rver";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { bucketStorage } from "@/lib/storage/bucket";
import { folderStorage, sweepIncoming } from "@/lib/storage/folder";
import type { Storage } from "@/lib/storage/stored-file";

const sha256 = (bytes: Uint8Array) => createHash("sha256").update(bytes).digest("hex");
const content = Buffer.from("a frame of a black hole, as bytes");

let root: string;
let server: S3rver;
const stores: Record<string, Storage> = {};

beforeAll(async () => {
  root = await mkdtemp(join(tmpdir(), "ringwright-storage-"));
  stores.folder = folderStorage(join(root, "folder"));
  server = new S3rver({
    port: 0,
    address: "127.0.0.1",
    silent: true,
    directory: join(root, "s3"),
    configureBuckets: [{ name: "frames" }],
  });
  const { port } = await server.run();
  stores.bucket = bucketStorage({
    bucket: "frames",
    region: "us-east-1",
    endpoint: `http://127.0.0.1:${port}`,
    credentials: { accessKeyId: "S3RVER", secretAccessKey: "S3RVER" },
  });
});

afterAll(async () => {
  await server.close();
  await rm(root, { recursive: true });
});

describe.each(["folder", "bucket"])("storage in a %s", (kind) => {
  const store = () => stores[kind]!;

  it("names what it keeps by its SHA-256 and gives the same bytes back", async () => {
    const stored = await store().put(content);
    expect(stored).toEqual({ sha256: sha256(content), bytes: content.length });
    expect(await buffer(await store().open(stored.sha256))).toEqual(content);
    expect(await store().size(stored.sha256)).toBe(content.length);
  });

  it("takes a stream as it takes bytes, and keeps the same content once", async () => {
    const pieces = [content.subarray(0, 7), content.subarray(7)];
    expect(await store().put(Readable.from(pieces))).toEqual(await store().put(content));
  });

  it("gives a range with both ends included", async () => {
    const { sha256: name } = await store().put(content);
    expect(await buffer(await store().open(name, { start: 2, end: 6 }))).toEqual(content.subarray(2, 7));
  });

  it("says in words that a file is not kept", async () => {
    const unknown = "0".repeat(64);
    expect(await store().size(unknown)).toBeUndefined();
    expect(await store().verify(unknown)).toBe(false);
    await expect(store().open(unknown)).rejects.toThrow("is not in storage");
  });

  it("refuses a name that could lead elsewhere", async () => {
    await expect(store().open("../../etc/passwd")).rejects.toThrow("64 hexadecimal figures");
  });

  it("finds by reading that a file is whole", async () => {
    const { sha256: name } = await store().put(content);
    expect(await store().verify(name)).toBe(true);
  });

  it("keeps nothing of a stream that breaks off", async () => {
    const broken = Readable.from(
      (async function* () {
        yield Buffer.from("half");
        throw new Error("the renderer died");
      })(),
    );
    await expect(store().put(broken)).rejects.toThrow("the renderer died");
    expect(await store().size(sha256(Buffer.from("half")))).toBeUndefined();
  });
});

describe("the folder", () => {
  it("shows nothing but whole files, and finds one that was changed behind its back", async () => {
    const { sha256: name } = await stores.folder!.put(Buffer.from("soon damaged"));
    expect(await readdir(join(root, "folder", "incoming"))).toEqual([]);
    await appendFile(join(root, "folder", name.slice(0, 2), name.slice(2)), "!");
    expect(await stores.folder!.verify(name)).toBe(false);
    await stores.folder!.put(Buffer.from("soon damaged"));
    expect(await stores.folder!.verify(name)).toBe(true);
  });

  it("sweeps away what a killed process left an hour ago, and not what is being written now", async () => {
    const incoming = join(root, "folder", "incoming");
    await writeFile(join(incoming, "old"), "half");
    await writeFile(join(incoming, "new"), "half");
    const now = Date.now();
    await utimes(join(incoming, "old"), now / 1000 - 7200, now / 1000 - 7200);
    await sweepIncoming(join(root, "folder"), now);
    expect(await readdir(incoming)).toEqual(["new"]);
    await rm(join(incoming, "new"));
  });
});
