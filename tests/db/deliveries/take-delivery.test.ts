import { execFileSync } from "node:child_process";
import { createHash } from "node:crypto";
import { mkdtempSync, readdirSync, readFileSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { and, eq, like } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { deliveries, deliveryFiles, downloads, recipients } from "@/db/schema/deliveries";
import { events, outbox } from "@/db/schema/events";
import { getDoor } from "@/lib/deliveries/get-door";
import { listDoors } from "@/lib/deliveries/list-doors";
import { streamFile } from "@/lib/deliveries/stream-file";
import { streamPicture } from "@/lib/deliveries/stream-picture";
import { streamZip } from "@/lib/deliveries/stream-zip";
import { withdrawDelivery } from "@/lib/deliveries/withdraw-delivery";
import { openDeliveringStudio, publishedDelivery } from "../../support/delivery-life";
import { codeOf, refusalOf } from "../../support/refusals";
import { addShot, type Studio } from "../../support/studio";

let studio: Studio;
beforeAll(async () => {
  studio = await openDeliveringStudio();
});
afterAll(() => studio.close());

let shots = 10;
const newDelivery = async () => {
  const place = { production: studio.production, sequence: studio.sequence, artist: studio.ids.artist };
  return publishedDelivery(studio, await addShot(studio.as.producer, place, `AB-${(shots += 10)}0`));
};
const request = (headers: Record<string, string> = {}, method = "GET") =>
  new Request("http://here/", { headers, method });
const takeZip = (delivery: string, headers = {}) =>
  streamZip(studio.as.client, { delivery }, request(headers));
const bytesOf = async (response: Response) => Buffer.from(await response.arrayBuffer());
const fileOf = async (delivery: string, kind: "png" | "exr") => {
  const where = and(eq(deliveryFiles.deliveryId, delivery), eq(deliveryFiles.kind, kind));
  return (await studio.db.select().from(deliveryFiles).where(where))[0]!;
};

describe("the archive", () => {
  it("is as long as was promised, unpacks with unzip and passes sha256sum --check", async () => {
    const { delivery } = await newDelivery();
    const response = await takeZip(delivery);
    const zip = await bytesOf(response);
    expect(zip.length).toBe(Number(response.headers.get("content-length")));
    const folder = mkdtempSync(join(tmpdir(), "ringwright-unzip-"));
    writeFileSync(join(folder, "it.zip"), zip);
    execFileSync("unzip", ["-q", "it.zip"], { cwd: folder });
    const [root] = readdirSync(folder).filter((name) => name !== "it.zip");
    expect(root).toMatch(/^AB-delivery-\d{3}$/);
    const said = execFileSync("sha256sum", ["--check", "--strict", "manifest-sha256.txt"], {
      cwd: join(folder, root!),
    });
    const lines = said.toString().trim().split("\n");
    expect(lines.every((line) => line.endsWith(": OK"))).toBe(true);
    const unpacked = readdirSync(join(folder, root!), { recursive: true, withFileTypes: true }).filter(
      (entry) => entry.isFile(),
    );
    expect(lines).toHaveLength(unpacked.length - 1);
    const { manifestDigest } = await getDoor(studio.as.client, { delivery });
    const manifest = readFileSync(join(folder, root!, "manifest-sha256.txt"));
    expect(createHash("sha256").update(manifest).digest("hex")).toBe(manifestDigest);
    const list = unpacked.find(({ name }) => name === "version-manifest.txt")!;
    const signed = createHash("sha256")
      .update(readFileSync(join(list.parentPath, list.name)))
      .digest("hex");
    expect(readFileSync(join(folder, root!, "science", "science-note.txt"), "utf8")).toContain(
      `digest ${signed}`,
    );
  });

  it("has the same bytes each time, so that what broke off can be resumed anywhere", async () => {
    const { delivery } = await newDelivery();
    const whole = await takeZip(delivery);
    const tag = whole.headers.get("etag")!;
    const bytes = await bytesOf(whole);
    for (const start of [1, 100, 4097, bytes.length - 5]) {
      const rest = await takeZip(delivery, { range: `bytes=${start}-`, "if-range": tag });
      expect(rest.status).toBe(206);
      expect((await bytesOf(rest)).equals(bytes.subarray(start))).toBe(true);
    }
    const stale = await takeZip(delivery, { range: "bytes=9-", "if-range": '"another"' });
    expect(stale.status).toBe(200);
    await stale.body!.cancel();
    expect((await takeZip(delivery, { range: `bytes=${bytes.length}-` })).status).toBe(416);
  });

  it("can be of one set, with the texts that belong to it", async () => {
    const { delivery, version } = await newDelivery();
    const response = await streamZip(studio.as.client, { delivery, set: version }, request());
    expect(response.headers.get("content-disposition")).toMatch(/AB-delivery-\d{3}-AB-\d+-v001\.zip/);
    expect((await bytesOf(response)).includes("manifest-sha256.txt")).toBe(true);
    const other = await newDelivery();
    expect(await codeOf(streamZip(studio.as.client, { delivery, set: other.version }, request()))).toBe(
      "not-found",
    );
  });

  it("is written down when it begins and when it ends, in the log and once to the producer", async () => {
    const { delivery } = await newDelivery();
    for (let time = 0; time < 2; time += 1) await bytesOf(await takeZip(delivery));
    const rows = await studio.db.select().from(downloads).where(eq(downloads.deliveryId, delivery));
    expect(rows).toHaveLength(2);
    for (const row of rows) expect(row).toMatchObject({ what: "everything", finishedAt: expect.any(Date) });
    expect(rows[0]!.bytes).toBeGreaterThan(1000);
    const taken = await studio.db.select().from(events).where(eq(events.kind, "delivery.taken"));
    expect(taken.filter(({ subject }) => subject.deliveryId === delivery)).toHaveLength(1);
    const letters = await studio.db
      .select()
      .from(outbox)
      .where(like(outbox.key, `mail delivery.taken ${delivery}%`));
    expect(letters).toMatchObject([{ payload: { to: "producer@ringwright.example" } }]);
  });

  it("stays unfinished in the record when the client breaks off", async () => {
    const { delivery } = await newDelivery();
    const response = await takeZip(delivery);
    const reader = response.body!.getReader();
    await reader.read();
    await reader.cancel();
    const [row] = await studio.db.select().from(downloads).where(eq(downloads.deliveryId, delivery));
    expect(row).toMatchObject({ bytes: 0, finishedAt: null });
  });

  it("breaks off when a stored file is not as it was signed, and the file is named to the producers", async () => {
    const { delivery } = await newDelivery();
    const { sha256, path } = await fileOf(delivery, "exr");
    const stored = join(process.env.STORAGE_DIR!, sha256.slice(0, 2), sha256.slice(2));
    const damaged = readFileSync(stored);
    damaged[damaged.length >> 1]! ^= 1;
    writeFileSync(stored, damaged);
    await expect(takeZip(delivery).then(bytesOf)).rejects.toThrow();
    const single = { delivery, path: path.split("/") };
    await expect(streamFile(studio.as.client, single, request()).then(bytesOf)).rejects.toThrow();
    const rows = await studio.db.select().from(downloads).where(eq(downloads.deliveryId, delivery));
    expect(rows.every(({ finishedAt }) => finishedAt === null)).toBe(true);
    const reports = async () =>
      studio.db
        .select()
        .from(outbox)
        .where(like(outbox.key, `mail delivery.damaged ${delivery}%`));
    await expect.poll(reports).toHaveLength(1);
    expect(JSON.stringify((await reports())[0]!.payload)).toContain(path);
    const logged = await studio.db.select().from(events).where(eq(events.kind, "delivery.damaged"));
    expect(logged[0]!.subject).toMatchObject({ file: path });
  });
});

describe("single files", () => {
  it("arrive whole or in part, under their delivered name", async () => {
    const { delivery } = await newDelivery();
    const file = await fileOf(delivery, "png");
    const take = (headers = {}) =>
      streamFile(studio.as.client, { delivery, path: file.path.split("/") }, request(headers));
    const whole = await take();
    expect(whole.headers.get("content-disposition")).toContain(file.path.split("/").at(-1));
    const bytes = await bytesOf(whole);
    expect(createHash("sha256").update(bytes).digest("hex")).toBe(file.sha256);
    const part = await take({ range: "bytes=10-19" });
    expect(part.headers.get("content-range")).toBe(`bytes 10-19/${bytes.length}`);
    expect((await bytesOf(part)).equals(bytes.subarray(10, 20))).toBe(true);
    expect((await bytesOf(await take({ range: "bytes=-7" }))).equals(bytes.subarray(-7))).toBe(true);
  });

  it("are not there under any other path", async () => {
    const { delivery } = await newDelivery();
    for (const path of [["nothing"], ["..", "..", "etc", "passwd"], ["frames"]])
      expect(await codeOf(streamFile(studio.as.client, { delivery, path }, request()))).toBe("not-found");
  });

  it("are described to HEAD without being taken", async () => {
    const { delivery } = await newDelivery();
    const head = await streamZip(studio.as.client, { delivery }, request({}, "HEAD"));
    expect(Number(head.headers.get("content-length"))).toBeGreaterThan(1000);
    expect(await studio.db.select().from(downloads).where(eq(downloads.deliveryId, delivery))).toEqual([]);
  });
});

describe("the door", () => {
  it("shows a small picture of a delivered frame", async () => {
    const { delivery, version } = await newDelivery();
    const picture = await bytesOf(await streamPicture(studio.as.client, { delivery, version }));
    expect(picture.subarray(1, 4).toString()).toBe("PNG");
  });

  it("is the recipient's alone: members are refused, strangers learn of nothing", async () => {
    const { delivery } = await newDelivery();
    for (const who of ["artist", "advisor", "producer", "owner"] as const)
      expect(await codeOf(streamZip(studio.as[who], { delivery }, request()))).toBe("forbidden");
    expect(await codeOf(streamZip(studio.as.stranger, { delivery }, request()))).toBe("not-found");
  });

  it("says that it has closed, once its days are over", async () => {
    const { delivery } = await newDelivery();
    const past = new Date(Date.now() - 1000);
    await studio.db.update(recipients).set({ expiresAt: past }).where(eq(recipients.deliveryId, delivery));
    expect(await getDoor(studio.as.client, { delivery })).toMatchObject({
      contents: null,
      state: { kind: "closed" },
    });
    expect(await refusalOf(takeZip(delivery))).toMatchObject({
      code: "gone",
      message: expect.stringMatching(/could be taken until/),
    });
    expect((await listDoors(studio.as.client)).map(({ id }) => id)).not.toContain(delivery);
  });

  it("says why, once the studio has withdrawn the delivery, and is gone once it was revoked", async () => {
    const { delivery } = await newDelivery();
    await withdrawDelivery(studio.as.producer, { delivery, words: "The wrong cut." });
    expect((await getDoor(studio.as.client, { delivery })).state).toMatchObject({
      kind: "closed",
      why: [expect.stringMatching(/withdrawn/), "“The wrong cut.”"],
    });
    expect(await codeOf(takeZip(delivery))).toBe("gone");
    await studio.db
      .update(recipients)
      .set({ revokedAt: new Date() })
      .where(eq(recipients.deliveryId, delivery));
    expect(await codeOf(getDoor(studio.as.client, { delivery }))).toBe("not-found");
    const [kept] = await studio.db.select().from(deliveries).where(eq(deliveries.id, delivery));
    expect(kept!.withdrawnWords).toBe("The wrong cut.");
  });
});
