import { eq, like, sql } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { deliveryItems, downloads } from "@/db/schema/deliveries";
import { events, outbox } from "@/db/schema/events";
import { verdicts } from "@/db/schema/reviews";
import { getDoor } from "@/lib/deliveries/get-door";
import { makeDelivery } from "@/lib/deliveries/make-delivery";
import { publishDelivery } from "@/lib/deliveries/publish-delivery";
import { startDownload } from "@/lib/deliveries/start-download";
import { getDeclaration } from "@/lib/reviews/get-declaration";
import { withdrawVerdict } from "@/lib/reviews/withdraw-verdict";
import {
  choose,
  judge,
  openDeliveringStudio,
  publishedDelivery,
  sentVersion,
  signedVersion,
} from "../../support/delivery-life";
import { beginVersion } from "../../support/frames";
import { codeOf, databaseRefusal, refusalOf } from "../../support/refusals";
import { addShot, type Studio } from "../../support/studio";

let studio: Studio;
beforeAll(async () => {
  studio = await openDeliveringStudio();
});
afterAll(() => studio.close());

let shots = 10;
const newShot = () => {
  const place = { production: studio.production, sequence: studio.sequence, artist: studio.ids.artist };
  return addShot(studio.as.producer, place, `AB-${(shots += 10)}0`);
};
const words = "The disk's inner edge was set wrongly.";
const withdraw = async (version: string, by = studio.as.advisor) => {
  const { after } = await getDeclaration(studio.as.advisor, { version });
  return withdrawVerdict(by, { version, words, after });
};

describe("withdrawing a verdict", () => {
  it("takes back every signed frame, in the log, and tells the maker and the producers", async () => {
    const { version } = await signedVersion(studio, await newShot());
    expect(await withdraw(version)).toMatchObject({ withdrawn: [{ first: 1001, last: 1002 }] });
    const { runs } = await getDeclaration(studio.as.advisor, { version });
    expect(runs).toMatchObject([{ kind: "withdrawn", first: 1001, last: 1002, words }]);
    const [event] = await studio.db.select().from(events).where(eq(events.kind, "verdict.withdrawn"));
    expect(event!.subject).toMatchObject({ versionId: version, words });
    const letters = await studio.db
      .select()
      .from(outbox)
      .where(like(outbox.key, `mail verdict ${runs[0]!.verdictId}%`));
    expect(letters).toHaveLength(2);
  });

  it("is refused to other roles and productions, and where nothing is signed", async () => {
    const { version } = await signedVersion(studio, await newShot());
    for (const who of ["artist", "producer", "owner"] as const)
      expect(await codeOf(withdraw(version, studio.as[who]))).toBe("forbidden");
    for (const who of ["client", "stranger"] as const)
      expect(await codeOf(withdraw(version, studio.as[who]))).toBe("not-found");
    const unsigned = await sentVersion(studio, await newShot());
    expect(await refusalOf(withdraw(unsigned))).toMatchObject({ code: "conflict" });
  });

  it("happens once when it is asked for twice at the same moment", async () => {
    const { version } = await signedVersion(studio, await newShot());
    const codes = await Promise.all([codeOf(withdraw(version)), codeOf(withdraw(version))]);
    expect(codes.sort()).toEqual(["conflict", "nothing was refused"]);
  });

  it("also takes back a version that a newer one has replaced", async () => {
    const shot = await newShot();
    const { version } = await signedVersion(studio, shot);
    await beginVersion(studio.as.artist, shot);
    expect(await codeOf(withdraw(version))).toBe("nothing was refused");
  });

  it("stops downloads of what was delivered, writes to each recipient, and says why at the door and no more", async () => {
    const { delivery, version } = await publishedDelivery(studio, await newShot());
    await withdraw(version);
    const letters = await studio.db
      .select()
      .from(outbox)
      .where(like(outbox.key, `mail delivery.stopped %${delivery}%`));
    expect(letters.map(({ payload }) => payload)).toMatchObject([{ to: "client@ringwright.example" }]);
    const door = await getDoor(studio.as.client, { delivery });
    expect(door).toMatchObject({ contents: null, state: { kind: "stopped" } });
    expect(JSON.stringify(door.state)).toContain(words);
    expect(await refusalOf(startDownload(studio.as.client, { delivery, what: "everything" }))).toMatchObject({
      code: "gone",
      message: expect.stringContaining("stopped"),
    });
    expect(
      await databaseRefusal(
        studio.db.insert(downloads).values({ deliveryId: delivery, personId: studio.ids.client, what: "x" }),
      ),
    ).toMatch(/door that is not open/);
  });

  it("leaves a delivery stopped though the same frames are signed again", async () => {
    const { delivery, version } = await publishedDelivery(studio, await newShot());
    await withdraw(version);
    await judge(studio, version);
    expect(await getDoor(studio.as.client, { delivery })).toMatchObject({ state: { kind: "stopped" } });
  });

  it("stops a delivery that holds frames which are returned, without the words meant for the artist", async () => {
    const { delivery, version } = await publishedDelivery(studio, await newShot());
    await judge(studio, version, "returned", { first: 1002 });
    const door = await getDoor(studio.as.client, { delivery });
    expect(door.state).toMatchObject({
      kind: "stopped",
      why: [expect.stringMatching(/no longer signs frame 1002/)],
    });
    expect(JSON.stringify(door)).not.toContain("far rim");
    const [letter] = await studio.db
      .select()
      .from(outbox)
      .where(like(outbox.key, `mail delivery.stopped %${delivery}%`));
    expect(JSON.stringify(letter!.payload)).not.toContain("far rim");
  });

  it("tells the client whichever comes first, when it meets the publication of the same frames", async () => {
    const signed = await signedVersion(studio, await newShot());
    const { delivery } = await makeDelivery(studio.as.producer, choose(studio, [signed]));
    const publish = publishDelivery(studio.as.producer, {
      delivery,
      recipients: [studio.ids.client],
      days: 7,
    });
    const [published] = await Promise.all([codeOf(publish), withdraw(signed.version)]);
    const letters = await studio.db
      .select()
      .from(outbox)
      .where(like(outbox.key, `mail delivery.stopped %${delivery}%`));
    expect(letters).toHaveLength(published === "nothing was refused" ? 1 : 0);
    expect(["nothing was refused", "conflict"]).toContain(published);
  });
});

describe("what the database itself refuses of verdicts and deliveries", () => {
  it("refuses an item of frames that are unsigned, returned, or signed by a verdict since withdrawn", async () => {
    const { version, verdict } = await signedVersion(studio, await newShot());
    const { delivery } = await makeDelivery(
      studio.as.producer,
      choose(studio, [await signedVersion(studio, await newShot())]),
    );
    const add = async (change: object = {}) => {
      const { digest } = await getDeclaration(studio.as.advisor, { version });
      const row = {
        deliveryId: delivery,
        productionId: studio.production,
        versionId: version,
        verdictId: verdict,
        digest: digest!,
      };
      return databaseRefusal(
        studio.db.insert(deliveryItems).values({ ...row, first: 1001, last: 1002, ...change }),
      );
    };
    expect(await add({ last: 1003 })).toMatch(/not all of frames/);
    expect(await add({ digest: "0".repeat(64) })).toMatch(/foreign key/);
    expect(await add({ verdictKind: "returned" })).toMatch(/foreign key|signed_only/);
    const { verdict: returned } = await judge(studio, version, "returned", { first: 1002 });
    expect(await add()).toMatch(/not all of frames/);
    expect(await add({ verdictId: returned, first: 1002 })).toMatch(/foreign key|not all of frames/);
    await withdraw(version);
    expect(await add({ last: 1001 })).toMatch(/not all of frames/);
  });

  it("refuses to publish a delivery whose sign-off was withdrawn", async () => {
    const signed = await signedVersion(studio, await newShot());
    const { delivery } = await makeDelivery(studio.as.producer, choose(studio, [signed]));
    await withdraw(signed.version);
    expect(
      await databaseRefusal(
        studio.db.execute(sql`update deliveries set published_at = now() where id = ${delivery}`),
      ),
    ).toMatch(/cannot be published/);
  });

  it.each(["verdicts", "submissions", "delivery_items", "delivery_files", "delivery_documents", "events"])(
    "refuses to change or empty %s",
    async (table) => {
      await publishedDelivery(studio, await newShot());
      const name = sql.identifier(table);
      const column = sql.identifier(
        { verdicts: "words", submissions: "words", delivery_items: "first", events: "kind" }[table] ?? "path",
      );
      expect(await databaseRefusal(studio.db.execute(sql`update ${name} set ${column} = ${column}`))).toMatch(
        /written once/,
      );
      expect(await databaseRefusal(studio.db.execute(sql`delete from ${name}`))).toMatch(/written once/);
      expect(await databaseRefusal(studio.db.execute(sql`truncate ${name} cascade`))).toMatch(/written once/);
    },
  );

  it("refuses to set a standing verdict by hand, or to take one away", async () => {
    const version = await sentVersion(studio, await newShot());
    await judge(studio, version, "returned");
    expect(
      await databaseRefusal(
        studio.db.execute(
          sql`update standing_verdicts set kind = 'signed off' where version_id = ${version}`,
        ),
      ),
    ).toMatch(/not the verdict that stands/);
    expect(await databaseRefusal(studio.db.execute(sql`delete from standing_verdicts`))).toMatch(
      /never removed/,
    );
    expect(await studio.db.select().from(verdicts).where(eq(verdicts.versionId, version))).toHaveLength(1);
  });
});
