// A studio whose versions can be carried to a client: real small PNG and OpenEXR files in the process's own storage.
import { mkdtempSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { people, memberships } from "@/db/schema/people";
import type { Role } from "@/db/enums";
import type { Ctx } from "@/lib/context";
import { makeDelivery } from "@/lib/deliveries/make-delivery";
import { publishDelivery } from "@/lib/deliveries/publish-delivery";
import { makeDeliverySchema } from "@/lib/deliveries/schema";
import { getDeclaration } from "@/lib/reviews/get-declaration";
import { giveVerdict } from "@/lib/reviews/give-verdict";
import { sendForReview } from "@/lib/reviews/send-for-review";
import type { ChosenKind } from "@/lib/reviews/schema";
import { storage } from "@/lib/storage/storage";
import type { Workshop } from "@/lib/renders/run-frame-job";
import { frameExr } from "@/render/files/frame-files";
import { encodePng } from "@/render/files/png";
import { openWorkshop, sealedVersion } from "./frames";
import { contextOf, openStudio, type Studio } from "./studio";

/** A picture of few colours that differs from frame to frame, in the files that a real frame has. */
const paintFrame: Workshop["renderFrame"] = async (setup, request) => {
  const { width, height } = setup.picture;
  const rgba = new Float32Array(4 * width * height).map((_, i) =>
    i % 4 === 3 ? 1 : ((i + request.frame) % 17) / 16,
  );
  const exr = frameExr({ width, height, rgba }, { setup, ...request });
  const codes = new Uint16Array(3 * width * height).map((_, i) => ((i + request.frame) % 17) * 3855);
  const png = encodePng(width, height, codes);
  return { png, exr, stats: { seconds: 0.1, paths: width * height, unresolved: 0 } };
};

/** `openStudio` with the process's storage in a folder of its own. Call it once in a test file, before anything else. */
export async function openDeliveringStudio(): Promise<Studio> {
  const studio = await openStudio();
  process.env.DATABASE_URL = studio.url;
  process.env.STORAGE_DIR = mkdtempSync(join(tmpdir(), "ringwright-storage-"));
  return studio;
}

/** One more person with a role in the studio's production. */
export async function addMember(
  studio: Studio,
  name: string,
  role: Role,
  production = studio.production,
): Promise<Ctx> {
  const email = `${name.toLowerCase()}@ringwright.example`;
  const [person] = await studio.db.insert(people).values({ email, name, passwordHash: "none" }).returning();
  await studio.db.insert(memberships).values({ productionId: production, personId: person!.id, role });
  return contextOf(studio.db, person!.id);
}

/** A whole version of the shot, two frames, not sent. */
export async function wholeVersion(studio: Studio, shot = studio.shot): Promise<string> {
  const workshop = openWorkshop(studio.db, { store: storage(), renderFrame: paintFrame });
  return (await sealedVersion(studio.as.artist, shot, workshop)).id;
}

export async function sentVersion(studio: Studio, shot = studio.shot): Promise<string> {
  const version = await wholeVersion(studio, shot);
  await sendForReview(studio.as.artist, { version, words: "Please look at the bright edge." });
  return version;
}

/** The advisor's verdict on all of a version's frames, or on some. */
export async function judge(
  studio: Studio,
  version: string,
  kind: ChosenKind = "signed off",
  change: { first?: number; last?: number; by?: Ctx } = {},
) {
  const { by = studio.as.advisor, ...range } = change;
  const { digest, after, first, last } = await getDeclaration(by, { version });
  const words = kind === "signed off" ? "As physics has it." : "The far rim is too thick.";
  return giveVerdict(by, { version, kind, first, last, words, figures: digest!.slice(-8), after, ...range });
}

export async function signedVersion(
  studio: Studio,
  shot = studio.shot,
): Promise<{ version: string; verdict: string }> {
  const version = await sentVersion(studio, shot);
  const { verdict } = await judge(studio, version);
  return { version, verdict };
}

/** The form's answers for a delivery of whole signed versions. */
export const choose = (studio: Studio, signed: { version: string; verdict: string }[], change: object = {}) =>
  makeDeliverySchema.parse({
    production: studio.production,
    title: "First light",
    items: signed.map((item) => ({ ...item, first: 1001, last: 1002 })),
    formats: ["png", "exr"],
    layout: "by shot",
    separator: ".",
    digits: 4,
    ...change,
  });

/** A delivery of one signed version, published to the studio's client. */
export async function publishedDelivery(studio: Studio, shot = studio.shot) {
  const signed = await signedVersion(studio, shot);
  const { delivery } = await makeDelivery(studio.as.producer, choose(studio, [signed]));
  await publishDelivery(studio.as.producer, { delivery, recipients: [studio.ids.client], days: 7 });
  return { delivery, ...signed };
}
