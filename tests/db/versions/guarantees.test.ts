import { createHash, randomUUID } from "node:crypto";
import { asc, eq, sql } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { frameFiles, frames, seals, versions } from "@/db/schema/versions";
import { beginVersion, openWorkshop, sealedVersion } from "../../support/frames";
import { addShot, openStudio, type Studio } from "../../support/studio";

let studio: Studio;
let sealed: string;
beforeAll(async () => {
  studio = await openStudio();
  sealed = (await sealedVersion(studio.as.artist, studio.shot, openWorkshop(studio.db))).id;
});
afterAll(() => studio.close());

/** The database's own words, without what the driver wraps around them. */
const refusal = async (work: Promise<unknown>): Promise<string> =>
  work.then(
    () => "nothing was refused",
    (error: Error) => String((error.cause as Error | undefined)?.message ?? error.message),
  );

describe("what the database itself refuses", () => {
  it.each(["versions", "frames", "frame_files", "seals"])("refuses to change or empty %s", async (table) => {
    const column = { versions: "kernel", frames: "paths", frame_files: "bytes", seals: "bytes" }[table]!;
    const name = sql.identifier(table);
    const same = sql.identifier(column);
    expect(await refusal(studio.db.execute(sql`update ${name} set ${same} = ${same}`))).toMatch(
      /written once/,
    );
    expect(await refusal(studio.db.execute(sql`delete from ${name}`))).toMatch(/written once/);
    expect(await refusal(studio.db.execute(sql`truncate ${name} cascade`))).toMatch(/written once/);
  });

  it("refuses a setup that is not what its digest says", async () => {
    const [row] = await studio.db.select().from(versions).where(eq(versions.id, sealed));
    const copy = { ...row!, id: randomUUID(), number: 99, setup: `${row!.setup} ` };
    expect(await refusal(studio.db.insert(versions).values(copy))).toMatch(/versions_setup_digest/);
  });

  it("refuses frames outside the version's range, and anything after the seal", async () => {
    const open = await beginVersion(studio.as.artist, await another("AB-020"));
    const add = (versionId: string, number: number) =>
      studio.db.insert(frames).values({ versionId, number, milliseconds: 1, paths: 1, unresolved: 0 });
    expect(await refusal(add(open.id, 1003))).toMatch(/outside 1001-1002/);
    expect(await refusal(add(sealed, 1001))).toMatch(/is sealed/);
    const file = { versionId: sealed, frame: 1001, kind: "png", sha256: "0".repeat(64), bytes: 1 } as const;
    expect(await refusal(studio.db.insert(frameFiles).values(file))).toMatch(/is sealed/);
  });

  it("refuses to seal while a frame is missing, and under any digest but the true one", async () => {
    const open = await beginVersion(studio.as.artist, await another("AB-030"));
    const seal = (digest: string) =>
      studio.db.insert(seals).values({ versionId: open.id, digest, frameCount: 2, bytes: 4 });
    expect(await refusal(seal("0".repeat(64)))).toMatch(/only 0 of 2 frames/);
    for (const frame of [1001, 1002]) {
      const row = { versionId: open.id, number: frame, milliseconds: 1, paths: 1, unresolved: 0 };
      await studio.db.insert(frames).values(row);
      for (const kind of ["png", "exr"] as const)
        await studio.db
          .insert(frameFiles)
          .values({ versionId: open.id, frame, kind, sha256: "a".repeat(64), bytes: 1 });
    }
    expect(await refusal(seal("0".repeat(64)))).toMatch(/not that of the files/);
  });

  const another = (code: string) => {
    const { production, sequence, ids } = studio;
    return addShot(studio.as.producer, { production, sequence, artist: ids.artist }, code);
  };
});

describe("the version's digest", () => {
  it("is what anyone computes from the setup, the kernel and the checksums of the files", async () => {
    const [version] = await studio.db.select().from(versions).where(eq(versions.id, sealed));
    const files = await studio.db
      .select()
      .from(frameFiles)
      .where(eq(frameFiles.versionId, sealed))
      .orderBy(asc(frameFiles.frame), asc(frameFiles.kind));
    const { setupDigest, kernel, quality, colourSpace, channels, first, last } = version!;
    const lines = [
      "ringwright version 1",
      `setup ${setupDigest}`,
      `kernel ${kernel}`,
      `quality ${quality}`,
      `colour ${colourSpace}`,
      `channels ${channels}`,
      `frames ${first}-${last}`,
      ...files.map(({ frame, kind, bytes, sha256 }) => `${frame} ${kind} ${bytes} ${sha256}`),
    ];
    const digest = createHash("sha256")
      .update(`${lines.join("\n")}\n`)
      .digest("hex");
    const [seal] = await studio.db.select().from(seals).where(eq(seals.versionId, sealed));
    expect(seal?.digest).toBe(digest);
  });
});
