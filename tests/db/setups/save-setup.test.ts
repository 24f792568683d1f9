import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { saveSetup } from "@/lib/setups/save-setup";
import { getSetup } from "@/lib/setups/get-setup";
import { saveSetupInput } from "@/lib/setups/schema";
import { openStudio, smallSetup, type Studio } from "../../support/studio";

let studio: Studio;
beforeAll(async () => void (studio = await openStudio()));
afterAll(() => studio.close());

const withSpin = (spin: number) => ({ ...smallSetup, hole: { ...smallSetup.hole, spin } });

describe("saving a setup", () => {
  it("keeps what was saved, under the next revision, with who and when", async () => {
    const before = await getSetup(studio.as.artist, { shot: studio.shot });
    const saved = await saveSetup(studio.as.artist, {
      shot: studio.shot,
      revision: before.revision,
      setup: withSpin(0.7),
    });
    expect(saved.revision).toBe(before.revision + 1);
    const after = await getSetup(studio.as.advisor, { shot: studio.shot });
    expect(after).toMatchObject({ revision: saved.revision, savedBy: "Artist Person", setup: withSpin(0.7) });
  });

  it("lets one of two people who save at once win, and tells the other who saved and when", async () => {
    const { revision } = await getSetup(studio.as.artist, { shot: studio.shot });
    const both = await Promise.allSettled([
      saveSetup(studio.as.artist, { shot: studio.shot, revision, setup: withSpin(0.1) }),
      saveSetup(studio.as.secondArtist, { shot: studio.shot, revision, setup: withSpin(0.2) }),
    ]);
    expect(both.map(({ status }) => status).sort()).toEqual(["fulfilled", "rejected"]);
    const winner = both[0]?.status === "fulfilled" ? "Artist Person" : "SecondArtist Person";
    const loser = both.find((one) => one.status === "rejected");
    expect(loser?.reason).toMatchObject({ code: "conflict" });
    expect(String(loser?.reason)).toMatch(
      new RegExp(`${winner} saved this setup at \\d\\d:\\d\\d; your change was not saved`),
    );
  });

  it("takes the same save again, after an answer that was lost, as done", async () => {
    const { revision } = await getSetup(studio.as.artist, { shot: studio.shot });
    const input = { shot: studio.shot, revision, setup: withSpin(0.33) };
    const first = await saveSetup(studio.as.artist, input);
    expect(await saveSetup(studio.as.artist, input)).toEqual(first);
  });

  it("refuses values that cannot be, naming the field", () => {
    const setup = { ...smallSetup, camera: { ...smallSetup.camera, radius: 1.2 } };
    const issue = saveSetupInput.safeParse({ shot: studio.shot, revision: 1, setup }).error?.issues[0];
    expect(issue?.path).toEqual(["setup", "camera", "radius"]);
    expect(issue?.message).toMatch(/inside the horizon/);
  });

  it("is refused to everyone but artists, and unknown outside the production", async () => {
    const input = { shot: studio.shot, revision: 1, setup: smallSetup };
    for (const who of ["advisor", "producer", "owner"] as const)
      await expect(saveSetup(studio.as[who], input)).rejects.toMatchObject({ code: "forbidden" });
    for (const who of ["client", "stranger"] as const) {
      await expect(saveSetup(studio.as[who], input)).rejects.toMatchObject({ code: "not-found" });
      await expect(getSetup(studio.as[who], { shot: studio.shot })).rejects.toMatchObject({
        code: "not-found",
      });
    }
  });

  it("is described in the same words whether a shot is another's or nobody's", async () => {
    const words = async (shot: string) =>
      getSetup(studio.as.stranger, { shot }).then(
        () => "",
        (error: Error) => error.message,
      );
    expect(await words(studio.shot)).toBe(await words("00000000-0000-4000-8000-000000000000"));
  });
});
