import { createHash } from "node:crypto";
import { eq } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { events } from "@/db/schema/events";
import { renders, versions } from "@/db/schema/versions";
import { cutIntoRuns } from "@/lib/renders/queue-frames";
import { changeShots } from "@/lib/shots/change-shots";
import { cancelVersion } from "@/lib/versions/cancel-version";
import { getVersion } from "@/lib/versions/get-version";
import { listVersions } from "@/lib/versions/list-versions";
import { renderVersion } from "@/lib/versions/render-version";
import { resumeVersion } from "@/lib/versions/resume-version";
import { renderVersionInput } from "@/lib/versions/schema";
import { canonicalJson } from "@/render/scene/canonical";
import { beginVersion, jobsOf } from "../../support/frames";
import { addShot, openStudio, smallSetup, type Studio } from "../../support/studio";

let studio: Studio;
beforeAll(async () => void (studio = await openStudio()));
afterAll(() => studio.close());

const newShot = (code: string) => {
  const { production, sequence, ids } = studio;
  return addShot(studio.as.producer, { production, sequence, artist: ids.artist }, code);
};

describe("rendering a version", () => {
  it("freezes the canonical setup under its SHA-256 and queues every frame once", async () => {
    const version = await beginVersion(studio.as.artist, studio.shot);
    const [row] = await studio.db.select().from(versions).where(eq(versions.id, version.id));
    expect(row?.setup).toBe(canonicalJson(smallSetup));
    expect(row?.setupDigest).toBe(createHash("sha256").update(row!.setup).digest("hex"));
    const job = { versionId: version.id, attempt: 1, first: 1001, last: 1002 };
    expect(await jobsOf(studio.db, version.id)).toEqual([job]);
    const [event] = await studio.db.select().from(events).where(eq(events.kind, "version.made"));
    expect(event?.subject).toMatchObject({ version: 1, shot: "AB-010", frames: "frames 1001–1002" });
  });

  it("gives people who press at once numbers one after the other", async () => {
    const shot = await newShot("AB-020");
    const made = await Promise.all(
      [studio.as.artist, studio.as.secondArtist, studio.as.artist].map((artist) =>
        beginVersion(artist, shot),
      ),
    );
    expect(made.map(({ number }) => number).sort()).toEqual([1, 2, 3]);
    expect((await listVersions(studio.as.producer, { shot })).map(({ number }) => number)).toEqual([3, 2, 1]);
  });

  it("refuses a shot that is held or omitted, and frames that the setup does not have", async () => {
    const shot = await newShot("AB-030");
    await expect(beginVersion(studio.as.artist, shot, { last: 1003 })).rejects.toMatchObject({
      code: "invalid",
      field: "last",
    });
    const hold = (hold: "on hold" | "omitted" | "none") =>
      changeShots(studio.as.producer, { shots: [shot], change: { what: "hold", hold } });
    await hold("on hold");
    await expect(beginVersion(studio.as.artist, shot)).rejects.toThrow("AB-030 is on hold");
    await hold("omitted");
    await expect(beginVersion(studio.as.artist, shot)).rejects.toThrow("AB-030 is marked omitted");
    await hold("none");
    await expect(beginVersion(studio.as.artist, shot)).resolves.toMatchObject({ number: 1 });
  });

  it("does not render a setup that someone saved since it was opened", async () => {
    const shot = await newShot("AB-040");
    const input = {
      shot,
      revision: 7,
      quality: "proof",
      colourSpace: "rec709",
      first: 1001,
      last: 1002,
    } as const;
    await expect(renderVersion(studio.as.artist, input)).rejects.toMatchObject({ code: "conflict" });
  });

  it("is refused to all but artists, and unknown outside the production", async () => {
    for (const who of ["advisor", "producer", "owner"] as const)
      await expect(renderVersion(studio.as[who], anyInput())).rejects.toMatchObject({ code: "forbidden" });
    for (const who of ["client", "stranger"] as const)
      await expect(renderVersion(studio.as[who], anyInput())).rejects.toMatchObject({ code: "not-found" });
  });

  it("refuses absurd frame counts and frames in the wrong order before it asks the database", () => {
    const issue = (first: number, last: number) =>
      renderVersionInput.safeParse({ ...anyInput(), first, last }).error?.issues[0];
    expect(issue(1, 20_000)).toBeUndefined();
    expect(issue(1, 20_001)).toMatchObject({ path: ["last"] });
    expect(issue(1002, 1001)?.message).toMatch(/must not come before/);
  });

  const anyInput = () =>
    ({
      shot: studio.shot,
      revision: 1,
      quality: "proof",
      colourSpace: "rec709",
      first: 1001,
      last: 1002,
    }) as const;
});

describe("cancelling and resuming", () => {
  it("stops a render once, and takes it up as a new attempt with the missing frames only", async () => {
    const shot = await newShot("AB-050");
    const { id } = await beginVersion(studio.as.artist, shot);
    const both = await Promise.allSettled(
      [studio.as.artist, studio.as.producer].map((ctx) => cancelVersion(ctx, { version: id })),
    );
    expect(both.map(({ status }) => status).sort()).toEqual(["fulfilled", "rejected"]);
    expect((await getVersion(studio.as.artist, { version: id })).standing).toBe("stopped");

    const resumed = await Promise.allSettled(
      [studio.as.artist, studio.as.producer].map((ctx) => resumeVersion(ctx, { version: id })),
    );
    expect(resumed.map(({ status }) => status).sort()).toEqual(["fulfilled", "rejected"]);
    const [render] = await studio.db.select().from(renders).where(eq(renders.versionId, id));
    expect(render).toMatchObject({ state: "rendering", attempt: 2, failure: null });
    expect((await jobsOf(studio.db, id)).map(({ attempt }) => attempt)).toEqual([1, 2]);
  });

  it("is refused to an advisor, and unknown outside the production", async () => {
    const { id: version } = await beginVersion(studio.as.artist, await newShot("AB-060"));
    for (const act of [cancelVersion, resumeVersion]) {
      await expect(act(studio.as.advisor, { version })).rejects.toMatchObject({ code: "forbidden" });
      await expect(act(studio.as.client, { version })).rejects.toMatchObject({ code: "not-found" });
      await expect(act(studio.as.stranger, { version })).rejects.toMatchObject({ code: "not-found" });
    }
    await expect(getVersion(studio.as.client, { version })).rejects.toMatchObject({ code: "not-found" });
  });

  it("renders nothing more of a shot that is on hold", async () => {
    const shot = await newShot("AB-070");
    const { id: version } = await beginVersion(studio.as.artist, shot);
    await cancelVersion(studio.as.artist, { version });
    await changeShots(studio.as.producer, { shots: [shot], change: { what: "hold", hold: "on hold" } });
    await expect(resumeVersion(studio.as.artist, { version })).rejects.toThrow("AB-070 is on hold");
  });
});

describe("cutting frames into jobs", () => {
  it("keeps runs short, without gaps, and few for a long shot", () => {
    expect(cutIntoRuns([1, 2, 3, 4, 5, 9])).toEqual([
      { first: 1, last: 4 },
      { first: 5, last: 5 },
      { first: 9, last: 9 },
    ]);
    const long = cutIntoRuns(Array.from({ length: 20_000 }, (_, index) => index));
    expect(long).toHaveLength(500);
    expect(long.at(-1)).toEqual({ first: 19_960, last: 19_999 });
  });
});
