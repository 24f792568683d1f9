import { eq } from "drizzle-orm";
import { verdicts } from "@/db/schema/reviews";
import { seals } from "@/db/schema/versions";
import { giveVerdict } from "../reviews/give-verdict";
import { as, type Stage, type VersionRow } from "./stage";
import type { StoryShot } from "./story";

/** The advisor's verdict on every frame, given as on the verdict page; its id. */
export async function judgeVersion(stage: Stage, story: StoryShot, version: VersionRow): Promise<string> {
  const find = () => stage.shop.db.select().from(verdicts).where(eq(verdicts.versionId, version.id));
  const [given] = await find();
  if (given) return given.id;
  const [seal] = await stage.shop.db.select().from(seals).where(eq(seals.versionId, version.id));
  await giveVerdict(as(stage, "advisor"), {
    version: version.id,
    kind: story.fate === "returned" ? "returned" : "signed off",
    first: version.first,
    last: version.last,
    words: story.words ?? "",
    figures: seal!.digest.slice(-8),
    after: null,
  });
  return (await find())[0]!.id;
}
