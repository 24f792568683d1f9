// What the review verbs take, and the facts their screens show. Free of Drizzle: shared with the forms.
import { z } from "zod";
import type { VerdictKind } from "@/db/enums";

const longestWords = 4000;

const words = z.string({ error: "Some words." }).trim().max(longestWords, "At most 4,000 characters.");

export const versionIdSchema = z.object({ version: z.uuid({ error: "The id of a version." }) });

export const sendForReviewSchema = versionIdSchema.extend({
  words: words.min(1, "Say what the advisor should look at."),
});

const frameNumber = z.int({ error: "A frame number." }).min(0, "A frame number.");

/** The newest verdict the reader had seen, so that two cannot be given past each other; null when there was none. */
const after = z.uuid().nullable();

export const giveVerdictSchema = versionIdSchema
  .extend({
    kind: z.enum(["signed off", "returned"], { error: "Signed off, or returned." }),
    first: frameNumber,
    last: frameNumber,
    words,
    /** The last eight figures of the digest, as the advisor wrote them. */
    figures: z.string({ error: "Write the last eight figures of the digest." }).trim().toLowerCase(),
    after,
  })
  .superRefine(({ kind, first, last, words: said }, context) => {
    if (last < first)
      context.addIssue({
        code: "custom",
        path: ["last"],
        message: `Frame ${last} comes before frame ${first}.`,
      });
    if (kind === "returned" && said === "")
      context.addIssue({ code: "custom", path: ["words"], message: "Say why the frames are returned." });
  });

export const withdrawVerdictSchema = versionIdSchema.extend({
  words: words.min(1, "Say why the verdict is withdrawn; everyone who was sent the frames is told."),
  after,
});

export type GiveVerdict = z.infer<typeof giveVerdictSchema>;
export type ChosenKind = GiveVerdict["kind"];

/** A run of frames on which one verdict stands. */
export interface StandingRun {
  verdictId: string;
  kind: VerdictKind;
  first: number;
  last: number;
  words: string;
  givenBy: string;
  givenAt: string;
}
