import { createHash } from "node:crypto";
import { eq, sql } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { openDatabase } from "@/db/client";
import { events } from "@/db/schema/events";
import { exportLog } from "@/lib/events/export-log";
import { listEvents } from "@/lib/events/list";
import { checkChain, readLog } from "@/lib/events/read-log";
import { recordEvent } from "@/lib/events/record";
import { codeOf, databaseRefusal } from "../../support/refusals";
import { openStudio, type Studio } from "../../support/studio";

let studio: Studio;
let elsewhere: string;
beforeAll(async () => {
  studio = await openStudio();
  elsewhere = [...studio.as.stranger.actor.roles.keys()][0]!;
  await note(elsewhere, "elsewhere@ringwright.example");
  await note(null, "studio@ringwright.example");
});
afterAll(() => studio.close());

const note = (productionId: string | null, email: string) =>
  studio.db.transaction((tx) =>
    recordEvent(tx, {
      productionId,
      actorId: studio.ids.producer,
      kind: "person.invited",
      subject: { by: "Producer\tPerson\n", email, role: "artist" },
    }),
  );

/** The law as the export states it, computed here without the database. */
function checkExport(text: string): { lines: string[]; broken: number | null } {
  const lines = text.split("\n").filter((line) => line !== "" && !line.startsWith("#"));
  const chain = /^# chain (.+)$/m.exec(text)![1]!;
  let before = "0".repeat(64);
  for (const [index, line] of lines.entries()) {
    const [seq, at, actor, kind, subject, previous, hash] = line.split("\t");
    const hashed = [previous, chain, seq, at, actor, kind, subject].join("\n");
    const right = createHash("sha256").update(hashed).digest("hex");
    if (previous !== before || hash !== right || Number(seq) !== index + 1)
      return { lines, broken: index + 1 };
    before = hash;
  }
  return { lines, broken: null };
}

describe("the event log", () => {
  it("is read newest first, in sentences, by the production's members and the owner", async () => {
    for (const who of ["artist", "advisor", "producer", "owner"] as const) {
      const page = await readLog(studio.as[who], { production: studio.production });
      expect(page).toMatchObject({
        name: "The Lantern Reef",
        brokenAt: null,
        total: page.lines.length,
        older: null,
      });
      expect(page.lines.map(({ seq }) => seq)).toEqual(page.lines.map((_line, index) => page.total - index));
      expect(page.lines.map(({ sentence }) => sentence)).toContain("Producer Person added AB-010.");
    }
  });

  it("is closed to clients and outsiders, and the studio's own to all but the owner", async () => {
    const here = { production: studio.production };
    expect(await codeOf(readLog(studio.as.client, here))).toBe("not-found");
    expect(await codeOf(readLog(studio.as.stranger, here))).toBe("not-found");
    expect(await codeOf(exportLog(studio.as.client, here))).toBe("not-found");
    expect(await codeOf(readLog(studio.as.producer, { production: "studio" }))).toBe("forbidden");
    const page = await readLog(studio.as.owner, { production: "studio" });
    expect(page.lines[0]!.sentence).toContain("studio@ringwright.example");
  });

  it("gives Today only what the reader may see", async () => {
    const sentences = async (who: "artist" | "client" | "stranger") =>
      (await listEvents(studio.as[who], { limit: 50 })).map(
        ({ sentence, productionId }) => `${productionId} ${sentence}`,
      );
    expect((await sentences("artist")).every((line) => line.startsWith(studio.production))).toBe(true);
    expect((await sentences("stranger")).join()).toContain("elsewhere@ringwright.example");
    expect(await sentences("client")).toEqual([]);
    expect(await listEvents(studio.as.artist, { limit: 1 })).toHaveLength(1);
  });

  it("comes in pages of a hundred, each beginning where the last ended", async () => {
    for (let n = 0; n < 120; n += 1) await note(elsewhere, `p${n}@ringwright.example`);
    const first = await readLog(studio.as.stranger, { production: elsewhere });
    const second = await readLog(studio.as.stranger, { production: elsewhere, before: first.older! });
    expect([first.lines.length, second.lines.length, second.older]).toEqual([100, 21, null]);
    expect(second.lines[0]!.seq).toBe(first.lines.at(-1)!.seq - 1);
  });

  it("is exported with all that was hashed: the chain can be checked without us", async () => {
    const { lines, broken } = checkExport(await exportLog(studio.as.stranger, { production: elsewhere }));
    expect(lines).toHaveLength(121);
    expect(broken).toBeNull();
    expect(lines[0]!.split("\t")).toHaveLength(8);
    const tampered = (await exportLog(studio.as.stranger, { production: elsewhere })).replace("p7@", "q7@");
    expect(checkExport(tampered).broken).toBe(9);
  });

  it("cannot be changed by the program, and says where it was changed by someone stronger", async () => {
    const forge = studio.db.update(events).set({ kind: "person.left" }).where(eq(events.chain, elsewhere));
    expect(await databaseRefusal(forge)).toMatch(/events is written once: UPDATE is refused/);
    expect(await databaseRefusal(studio.db.delete(events))).toMatch(/DELETE is refused/);
    expect(await checkChain(studio.db, elsewhere)).toEqual({ total: 121, brokenAt: null });

    const strong = openDatabase(studio.url, 1);
    await strong.execute(sql`alter table events disable trigger written_once`);
    await strong.execute(
      sql`update events set subject = '{"by": "Eve"}' where chain = ${elsewhere} and seq = 40`,
    );
    await strong.execute(sql`alter table events enable trigger written_once`);
    await strong.$client.end();
    expect(await checkChain(studio.db, elsewhere)).toEqual({ total: 121, brokenAt: 40 });
    expect(await checkChain(studio.db, studio.production)).toMatchObject({ brokenAt: null });
  });
});
