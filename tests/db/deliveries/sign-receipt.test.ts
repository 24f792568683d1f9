import { eq, like } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { receipts } from "@/db/schema/deliveries";
import { events, outbox } from "@/db/schema/events";
import { getDoor } from "@/lib/deliveries/get-door";
import { listDeliveries } from "@/lib/deliveries/list-deliveries";
import { signReceiptSchema } from "@/lib/deliveries/schema";
import { signReceipt } from "@/lib/deliveries/sign-receipt";
import { startDownload } from "@/lib/deliveries/start-download";
import { getDeclaration } from "@/lib/reviews/get-declaration";
import { withdrawVerdict } from "@/lib/reviews/withdraw-verdict";
import type { Ctx } from "@/lib/context";
import { openDeliveringStudio, publishedDelivery } from "../../support/delivery-life";
import { codeOf, databaseRefusal, refusalOf } from "../../support/refusals";
import { addShot, type Studio } from "../../support/studio";

let studio: Studio;
beforeAll(async () => {
  studio = await openDeliveringStudio();
});
afterAll(() => studio.close());

let shots = 10;
async function newTaken() {
  const place = { production: studio.production, sequence: studio.sequence, artist: studio.ids.artist };
  const made = await publishedDelivery(
    studio,
    await addShot(studio.as.producer, place, `AB-${(shots += 10)}0`),
  );
  await startDownload(studio.as.client, { delivery: made.delivery, what: "everything" });
  const { manifestDigest } = await getDoor(studio.as.client, made);
  return { ...made, manifestDigest };
}
const sign = (
  who: Ctx,
  { delivery, manifestDigest }: { delivery: string; manifestDigest: string },
  change: object = {},
) => signReceipt(who, { delivery, manifestDigest, kind: "received", words: "", ...change });

describe("signing a receipt", () => {
  it("keeps the client's sentence under the manifest's digest, in the log, and tells the producer", async () => {
    const taken = await newTaken();
    const { statement } = await sign(studio.as.client, taken);
    expect(statement).toMatch(
      /^I, Client Person, have received \d+ files of delivery \d+, First light, each as it was signed/,
    );
    expect(statement).toContain(taken.manifestDigest);
    const [event] = await studio.db.select().from(events).where(eq(events.kind, "receipt.signed"));
    expect(event!.subject).toMatchObject({ deliveryId: taken.delivery, by: "Client Person" });
    const letters = await studio.db
      .select()
      .from(outbox)
      .where(like(outbox.key, `mail receipt ${taken.delivery}%`));
    expect(letters).toMatchObject([{ payload: { to: "producer@ringwright.example" } }]);
    const line = (await listDeliveries(studio.as.producer)).find(({ id }) => id === taken.delivery);
    expect(line).toMatchObject({ standing: "received" });
  });

  it("refuses with the client's words, which the studio reads", async () => {
    const taken = await newTaken();
    await sign(studio.as.client, taken, { kind: "refused", words: "Frame 1002 is torn." });
    const line = (await listDeliveries(studio.as.producer)).find(({ id }) => id === taken.delivery);
    expect(line).toMatchObject({ standing: "refused" });
    const without = { ...taken, kind: "refused", words: " " };
    expect(signReceiptSchema.safeParse(without).error?.issues[0]?.path).toEqual(["words"]);
  });

  it("is for the client it was published to, under the digest they saw, after something was taken", async () => {
    const taken = await newTaken();
    for (const who of ["artist", "advisor", "producer", "owner"] as const)
      expect(await codeOf(sign(studio.as[who], taken))).toBe("forbidden");
    expect(await codeOf(sign(studio.as.stranger, taken))).toBe("not-found");
    expect(
      await refusalOf(sign(studio.as.client, { ...taken, manifestDigest: "0".repeat(64) })),
    ).toMatchObject({
      code: "invalid",
      field: "manifestDigest",
    });
    const place = { production: studio.production, sequence: studio.sequence, artist: studio.ids.artist };
    const untaken = await publishedDelivery(studio, await addShot(studio.as.producer, place, "AB-990"));
    const { manifestDigest } = await getDoor(studio.as.client, untaken);
    expect(await refusalOf(sign(studio.as.client, { ...untaken, manifestDigest }))).toMatchObject({
      code: "conflict",
      message: expect.stringMatching(/Nothing .* taken yet/),
    });
  });

  it("happens once, even when it is sent twice at the same moment, and is never altered", async () => {
    const taken = await newTaken();
    const codes = await Promise.all([
      codeOf(sign(studio.as.client, taken)),
      codeOf(sign(studio.as.client, taken)),
    ]);
    expect(codes.sort()).toEqual(["conflict", "nothing was refused"]);
    expect(await databaseRefusal(studio.db.update(receipts).set({ words: "x" }))).toMatch(/written once/);
    expect(await databaseRefusal(studio.db.delete(receipts))).toMatch(/written once/);
  });

  it("cannot confirm a delivery that was stopped, but can still refuse it", async () => {
    const taken = await newTaken();
    const { after } = await getDeclaration(studio.as.advisor, taken);
    await withdrawVerdict(studio.as.advisor, { version: taken.version, words: "The edge is wrong.", after });
    expect(await codeOf(sign(studio.as.client, taken))).toBe("gone");
    expect(await codeOf(sign(studio.as.client, taken, { kind: "refused", words: "Stopped." }))).toBe(
      "nothing was refused",
    );
  });
});
