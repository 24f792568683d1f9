import { z } from "zod";
import { colourSpaces, fileKinds, qualities } from "@/db/enums";
import { maximumFrames } from "@/render/scene/setup";

const frameNumber = z.coerce
  .number({ error: "A whole frame number." })
  .int("A whole frame number.")
  .min(0)
  .max(999_999);

export const versionIdInput = z.object({ version: z.uuid("This is not the id of a version.") });

export const renderVersionInput = z
  .object({
    shot: z.uuid("This is not the id of a shot."),
    /** The setup as the artist saw it: a later save by someone else is not rendered unseen. */
    revision: z.number().int().min(1),
    quality: z.enum(qualities, { error: "Choose proof or master." }),
    colourSpace: z.enum(colourSpaces, { error: "Choose Rec.709 or ACEScg." }),
    first: frameNumber,
    last: frameNumber,
  })
  .refine(({ first, last }) => last >= first, {
    path: ["last"],
    error: "The last frame must not come before the first.",
  })
  .refine(({ first, last }) => last - first < maximumFrames, {
    path: ["last"],
    error: `A version holds at most ${maximumFrames.toLocaleString("en")} frames.`,
  });
export type RenderVersionInput = z.infer<typeof renderVersionInput>;

export const frameFileInput = versionIdInput.extend({
  frame: frameNumber,
  kind: z.enum(fileKinds, { error: "A frame's file is png or exr." }),
});

export const thumbnailInput = versionIdInput.extend({
  frame: frameNumber,
  width: z.coerce.number().pipe(z.union([z.literal(168), z.literal(336)], { error: "168 or 336 pixels." })),
});

/** What each quality and colour space is called on screens. */
export const qualityWords: Record<(typeof qualities)[number], string> = {
  proof: "proof, one light path a pixel",
  master: "master, four light paths a pixel",
};

export const colourSpaceWords: Record<(typeof colourSpaces)[number], string> = {
  rec709: "linear Rec.709",
  acescg: "ACEScg",
};
