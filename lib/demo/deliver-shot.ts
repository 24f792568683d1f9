import { eq } from "drizzle-orm";
import { deliveries, deliveryItems, receipts } from "@/db/schema/deliveries";
import { makeDelivery } from "../deliveries/make-delivery";
import { publishDelivery } from "../deliveries/publish-delivery";
import { signReceipt } from "../deliveries/sign-receipt";
import { streamZip } from "../deliveries/stream-zip";
import { as, type Stage, type VersionRow } from "./stage";
import type { StoryShot } from "./story";

/** Delivers the signed version to the client and, where the story says so, signs or refuses its receipt. */
export async function deliverShot(
  stage: Stage,
  story: StoryShot,
  version: VersionRow,
  verdict: string,
): Promise<void> {
  const delivery = await findOrMake(stage, story, version, verdict);
  if (!delivery.publishedAt)
    await publishDelivery(as(stage, "producer"), {
      delivery: delivery.id,
      recipients: [stage.studio.client.id],
      days: 30,
    });
  if (story.fate === "delivered") return;
  const [signed] = await stage.shop.db.select().from(receipts).where(eq(receipts.deliveryId, delivery.id));
  if (signed) return;
  await takeEverything(stage, delivery.id);
  const kind = story.fate === "refused" ? "refused" : "received";
  const words =
    kind === "refused" ? "The dome's front is not where our projectors expect it; please talk to us." : "";
  await signReceipt(as(stage, "client"), {
    delivery: delivery.id,
    kind,
    manifestDigest: delivery.manifestDigest!,
    words,
  });
}

/** The client takes the whole package, as a browser would, so that the receipt is about something taken. */
async function takeEverything(stage: Stage, delivery: string): Promise<void> {
  const request = new Request("http://127.0.0.1/", { method: "GET" });
  const response = await streamZip(as(stage, "client"), { delivery }, request);
  await response.arrayBuffer();
}

async function findOrMake(stage: Stage, story: StoryShot, version: VersionRow, verdict: string) {
  const find = () =>
    stage.shop.db
      .select()
      .from(deliveryItems)
      .innerJoin(deliveries, eq(deliveries.id, deliveryItems.deliveryId))
      .where(eq(deliveryItems.versionId, version.id));
  const [made] = await find();
  if (made) return made.deliveries;
  const dome = stage.production.kind === "dome";
  const { id, productionId, first, last } = version;
  await makeDelivery(as(stage, "producer"), {
    production: productionId,
    title: dome ? "Dome test, stars alone" : `${stage.sequence.name}, ${story.code}`,
    words: "",
    items: [{ version: id, verdict, first, last }],
    formats: ["png", "exr"],
    layout: "by shot",
    separator: dome ? "_" : ".",
    digits: dome ? 5 : 4,
  });
  return (await find())[0]!.deliveries;
}
