import { eq } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { deliveries, deliveryDocuments, deliveryFiles } from "@/db/schema/deliveries";
import { frameFiles, versions } from "@/db/schema/versions";
import { getDelivery } from "@/lib/deliveries/get-delivery";
import { listDeliveries } from "@/lib/deliveries/list-deliveries";
import { listSigned } from "@/lib/deliveries/list-signed";
import { makeDelivery } from "@/lib/deliveries/make-delivery";
import { measureDelivery } from "@/lib/deliveries/measure-delivery";
import { publishDelivery } from "@/lib/deliveries/publish-delivery";
import { withdrawDelivery } from "@/lib/deliveries/withdraw-delivery";
import { getDeclaration } from "@/lib/reviews/get-declaration";
import {
  addMember,
  choose,
  judge,
  openDeliveringStudio,
  sentVersion,
  signedVersion,
} from "../../support/delivery-life";
import { codeOf, refusalOf } from "../../support/refusals";
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
const newSigned = async () => signedVersion(studio, await newShot());
const others = ["artist", "advisor", "owner"] as const;

describe("what can be delivered", () => {
  it("is each run of frames that one sign-off stands on, with its size", async () => {
    const version = await sentVersion(studio, await newShot());
    await judge(studio, version, "signed off", { last: 1001 });
    await judge(studio, version, "returned", { first: 1002 });
    const { runs } = await listSigned(studio.as.producer, { production: studio.production });
    const mine = runs.filter((run) => run.version === version);
    expect(mine).toMatchObject([{ first: 1001, last: 1001, number: 1, newest: 1, deliveredIn: [] }]);
    const files = await studio.db.select().from(frameFiles).where(eq(frameFiles.versionId, version));
    const of = (kind: string) => files.find((file) => file.frame === 1001 && file.kind === kind)!.bytes;
    expect(mine[0]).toMatchObject({ pngBytes: of("png"), exrBytes: of("exr") });
  });

  it("is told to producers only", async () => {
    const ask = (who: (typeof others)[number] | "client" | "stranger") =>
      codeOf(listSigned(studio.as[who], { production: studio.production }));
    for (const who of others) expect(await ask(who)).toBe("forbidden");
    for (const who of ["client", "stranger"] as const) expect(await ask(who)).toBe("not-found");
  });
});

describe("making a delivery", () => {
  it("holds exactly the signed bytes under new names, of the size measured before", async () => {
    const signed = [await newSigned(), await newSigned()];
    const choice = choose(studio, signed);
    const size = await measureDelivery(studio.as.producer, choice);
    const made = await makeDelivery(studio.as.producer, choice);
    expect(made).toMatchObject({ files: size.files, bytes: size.bytes });
    const files = await studio.db
      .select()
      .from(deliveryFiles)
      .where(eq(deliveryFiles.deliveryId, made.delivery));
    expect(files).toHaveLength(8);
    for (const file of files) {
      expect(file.path).toMatch(
        /^frames\/AB-\d+-v001_1001-1002\/(png|exr)\/AB-\d+-v001\.100[12]\.(png|exr)$/,
      );
      const kept = await studio.db.select().from(frameFiles).where(eq(frameFiles.sha256, file.sha256));
      expect(kept.some((row) => row.versionId === file.versionId && row.frame === file.frame)).toBe(true);
    }
  });

  it("carries each setup byte for byte, and a manifest of everything but itself, sorted", async () => {
    const signed = await newSigned();
    const { delivery } = await makeDelivery(studio.as.producer, choose(studio, [signed]));
    const texts = await studio.db
      .select()
      .from(deliveryDocuments)
      .where(eq(deliveryDocuments.deliveryId, delivery));
    const [version] = await studio.db.select().from(versions).where(eq(versions.id, signed.version));
    expect(texts.find(({ path }) => path.endsWith("setup.json"))?.body).toBe(version!.setup);
    const files = await studio.db.select().from(deliveryFiles).where(eq(deliveryFiles.deliveryId, delivery));
    const manifest = texts.find(({ path }) => path === "manifest-sha256.txt")!;
    const lines = manifest.body.trimEnd().split("\n");
    const paths = lines.map((line) => line.slice(66));
    expect(paths).toEqual([...paths].sort());
    const listed = [...files, ...texts]
      .map(({ path }) => path)
      .filter((path) => path !== "manifest-sha256.txt");
    expect(paths).toEqual(listed.sort());
    const [row] = await studio.db.select().from(deliveries).where(eq(deliveries.id, delivery));
    expect(row!.manifestDigest).toBe(manifest.sha256);
  });

  it("says in the science note who signed which frames of which digest, in which words, and that no flash screening was made", async () => {
    const signed = await newSigned();
    const { delivery } = await makeDelivery(studio.as.producer, choose(studio, [signed]));
    const { note } = await getDelivery(studio.as.producer, { delivery });
    const { digest } = await getDeclaration(studio.as.advisor, { version: signed.version });
    const flowing = note.replace(/\s+/g, " ");
    for (const part of [
      `digest ${digest}`,
      "frames 1001 to 1002",
      "Signed off by Advisor Person, science advisor",
      "“As physics has it.”",
      "WHAT IS COMPUTED",
      "WHAT IS CHOSEN",
      "WHAT IS LEFT OUT",
      "No flash or motion screening was made",
      "A qualified test and the venue's own policy decide",
    ])
      expect(flowing).toContain(part);
  });

  it("leaves out the list of a version's files when only some of them are delivered", async () => {
    const signed = await newSigned();
    const { delivery } = await makeDelivery(
      studio.as.producer,
      choose(studio, [signed], { formats: ["png"] }),
    );
    const { texts, sets } = await getDelivery(studio.as.producer, { delivery });
    expect(texts.map(({ path }) => path).some((path) => path.includes("version-manifest"))).toBe(false);
    expect(sets).toMatchObject([{ files: 2, pngs: 2, exrs: 0 }]);
  });

  it("is refused to other roles and productions", async () => {
    const choice = choose(studio, [await newSigned()]);
    for (const who of others) {
      expect(await codeOf(makeDelivery(studio.as[who], choice))).toBe("forbidden");
      expect(await codeOf(measureDelivery(studio.as[who], choice))).toBe("forbidden");
    }
    for (const who of ["client", "stranger"] as const)
      expect(await codeOf(makeDelivery(studio.as[who], choice))).toBe("not-found");
  });

  it("is refused for frames that are not signed, and for another production's version", async () => {
    const version = await sentVersion(studio, await newShot());
    const { verdict } = await judge(studio, version, "returned");
    expect(await codeOf(makeDelivery(studio.as.producer, choose(studio, [{ version, verdict }])))).toBe(
      "conflict",
    );
    const signed = await newSigned();
    const beyond = choose(studio, [signed], { items: [{ ...signed, first: 1001, last: 1003 }] });
    expect(await codeOf(makeDelivery(studio.as.producer, beyond))).toBe("conflict");
    const elsewhere = await codeOf(
      makeDelivery(studio.as.stranger, { ...choose(studio, [signed]), production: strangers() }),
    );
    expect(elsewhere).toBe("not-found");
  });

  it("numbers two deliveries made at the same moment apart", async () => {
    const signed = [await newSigned(), await newSigned()];
    const made = await Promise.all(
      signed.map((one) => makeDelivery(studio.as.producer, choose(studio, [one]))),
    );
    expect(made[0]!.number).not.toBe(made[1]!.number);
  });
});

describe("publishing and withdrawing a delivery", () => {
  const newMade = async () =>
    (await makeDelivery(studio.as.producer, choose(studio, [await newSigned()]))).delivery;
  const recipients = () => [studio.ids.client];

  it("is for the producer, and goes to the production's clients only", async () => {
    const delivery = await newMade();
    for (const who of others)
      expect(
        await codeOf(publishDelivery(studio.as[who], { delivery, recipients: recipients(), days: 7 })),
      ).toBe("forbidden");
    for (const who of ["client", "stranger"] as const)
      expect(
        await codeOf(publishDelivery(studio.as[who], { delivery, recipients: recipients(), days: 7 })),
      ).toBe("not-found");
    const outsider = await addMember(studio, "Outsider", "client", strangers());
    for (const id of [studio.ids.artist, outsider.actor.id])
      expect(
        await refusalOf(publishDelivery(studio.as.producer, { delivery, recipients: [id], days: 7 })),
      ).toMatchObject({
        code: "invalid",
        field: "recipients",
      });
  });

  it("happens once when it is done twice at the same moment, and lasts the days that were chosen", async () => {
    const delivery = await newMade();
    const publish = () =>
      codeOf(publishDelivery(studio.as.producer, { delivery, recipients: recipients(), days: 3 }));
    expect((await Promise.all([publish(), publish()])).sort()).toEqual(["conflict", "nothing was refused"]);
    const page = await getDelivery(studio.as.artist, { delivery });
    const [door] = page.recipients;
    expect(Date.parse(door!.expiresAt) - Date.parse(page.publishedAt!)).toBe(3 * 86_400_000);
  });

  it("withdraws once, for the producer alone, and cannot be published afterwards", async () => {
    const delivery = await newMade();
    const withdraw = (who: keyof Studio["as"]) =>
      codeOf(withdrawDelivery(studio.as[who], { delivery, words: "Wrong cut." }));
    for (const who of others) expect(await withdraw(who)).toBe("forbidden");
    for (const who of ["client", "stranger"] as const) expect(await withdraw(who)).toBe("not-found");
    expect((await Promise.all([withdraw("producer"), withdraw("producer")])).sort()).toEqual([
      "conflict",
      "nothing was refused",
    ]);
    expect(
      await codeOf(publishDelivery(studio.as.producer, { delivery, recipients: recipients(), days: 7 })),
    ).toBe("conflict");
  });

  it("lists where each delivery stands for members, and nothing for others", async () => {
    const delivery = await newMade();
    await publishDelivery(studio.as.producer, { delivery, recipients: recipients(), days: 7 });
    const line = (await listDeliveries(studio.as.artist)).find(({ id }) => id === delivery);
    expect(line).toMatchObject({ standing: "delivered", recipients: ["Client Person"], yours: false });
    expect(await listDeliveries(studio.as.client)).toEqual([]);
    expect(await listDeliveries(studio.as.stranger)).toEqual([]);
    expect(await codeOf(getDelivery(studio.as.stranger, { delivery }))).toBe("not-found");
    expect(await codeOf(getDelivery(studio.as.client, { delivery }))).toBe("not-found");
  });
});

const strangers = () => [...studio.as.stranger.actor.roles.keys()][0]!;
