import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { changeShots } from "@/lib/shots/change-shots";
import { createSequence } from "@/lib/shots/create-sequence";
import { listShots } from "@/lib/shots/list-shots";
import { dateIn } from "@/lib/shots/today";
import { cancelVersion } from "@/lib/versions/cancel-version";
import { beginVersion, openWorkshop, sealedVersion } from "../../support/frames";
import { addShot, openStudio, type Studio } from "../../support/studio";

let studio: Studio;
let rendering: string;

beforeAll(async () => {
  studio = await openStudio();
  const { production, ids, as } = studio;
  const second = await createSequence(as.producer, { production, name: "The rim" });
  const add = (code: string, artist: string | null = ids.artist) =>
    addShot(as.producer, { production, sequence: second.id, artist }, code);
  await sealedVersion(as.artist, studio.shot, openWorkshop(studio.db));
  rendering = await add("AB-020");
  await beginVersion(as.artist, rendering);
  const stopped = await add("AB-030");
  await cancelVersion(as.artist, { version: (await beginVersion(as.artist, stopped)).id });
  await add("AB-040", null);
  const change = (shot: string, dueOn: string) =>
    changeShots(as.producer, { shots: [shot], change: { what: "due", dueOn } });
  await change(stopped, "2020-01-02");
  await change(rendering, "2199-01-01");
  const held = await add("AB-050");
  await change(held, "2020-01-01");
  await changeShots(as.producer, { shots: [held], change: { what: "hold", hold: "on hold" } });
});
afterAll(() => studio.close());

const linesOf = async (input: Parameters<typeof listShots>[1] = {}) =>
  (await listShots(studio.as.producer, input)).groups.flatMap(({ shots }) => shots);

describe("the list of shots", () => {
  it("says of each shot its standing, its version and who has it", async () => {
    const lines = await linesOf();
    expect(lines.map(({ code, standing, version }) => [code, standing, version?.number ?? null])).toEqual([
      ["AB-010", "ready", 1],
      ["AB-020", "rendering", 1],
      ["AB-030", "stopped", 1],
      ["AB-040", "open", null],
      ["AB-050", "on hold", null],
    ]);
    expect(lines.map(({ holder }) => (holder.kind === "person" ? holder.name : holder.kind))).toEqual([
      "Artist Person",
      "queue",
      "Artist Person",
      "nobody",
      "nobody",
    ]);
  });

  it("counts what asks for work, what is late and the machine time, over the whole production", async () => {
    const { totals } = await listShots(studio.as.advisor, { standing: "open" });
    expect(totals).toEqual({ shots: 5, asking: 1, late: 1, milliseconds: 500 });
  });

  it("groups by sequence, and tells how many each has even when some are not shown", async () => {
    const { groups } = await listShots(studio.as.artist, { standing: "ready" });
    expect(groups.map(({ name, shotCount, shots }) => [name, shotCount, shots.length])).toEqual([
      ["Approach", 1, 1],
      ["The rim", 4, 0],
    ]);
  });

  it("filters by who has it and orders by due date, standing or machine time", async () => {
    const codes = async (input: Parameters<typeof listShots>[1]) =>
      (await linesOf(input)).map(({ code }) => code);
    expect(await codes({ holder: "queue" })).toEqual(["AB-020"]);
    expect(await codes({ holder: studio.ids.artist })).toEqual(["AB-010", "AB-030"]);
    expect(await codes({ order: "due date" })).toEqual(["AB-050", "AB-030", "AB-020", "AB-010", "AB-040"]);
    expect((await codes({ order: "machine time" }))[0]).toBe("AB-010");
    expect(await codes({ order: "standing" })).toEqual(["AB-040", "AB-020", "AB-030", "AB-010", "AB-050"]);
  });

  it("shows a shot by a finished frame of its newest version that has one", async () => {
    const [first, second] = await linesOf();
    expect(first?.picture).toMatchObject({ frame: 1001 });
    expect(second?.picture).toBeNull();
  });

  it("is empty of anything for a client or a stranger, who learn of nothing", async () => {
    const production = studio.production;
    await expect(listShots(studio.as.client, { production })).rejects.toMatchObject({ code: "not-found" });
    await expect(listShots(studio.as.client, {})).rejects.toMatchObject({ code: "not-found" });
    await expect(listShots(studio.as.stranger, { production })).rejects.toMatchObject({ code: "not-found" });
  });
});

describe("the reader's date", () => {
  it("turns at the reader's own midnight", () => {
    const at = new Date("2031-10-20T23:30:00Z");
    expect(dateIn("UTC", at)).toBe("2031-10-20");
    expect(dateIn("Europe/Berlin", at)).toBe("2031-10-21");
  });
});
