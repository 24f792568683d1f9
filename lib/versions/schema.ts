import { z } from "zod";
import {
  colourSpaces,
  fileKinds,
  qualities,
  type ColourSpace,
  type Quality,
  type RenderState,
  type Role,
} from "@/db/enums";
import { maximumFrames, type Setup } from "@/render/scene/setup";
import type { Standing } from "../shots/schema-standing";

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

export const filesInput = versionIdInput.extend({ from: frameNumber.default(0) });

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

export type { ColourSpace, Quality };

export interface VersionLine {
  id: string;
  number: number;
  standing: Standing;
  quality: Quality;
  colourSpace: ColourSpace;
  first: number;
  last: number;
  madeAt: string;
  maker: string;
  /** Once sealed. */
  digest: string | null;
  /** Finished frames. */
  done: number;
  firstFinished: number | null;
}

export interface FileLine {
  frame: number;
  kind: "png" | "exr";
  sha256: string;
  bytes: number;
  /** What it is called when it is taken. */
  name: string;
}

/** How its rendering stands. */
export interface RenderFacts {
  state: RenderState;
  attempt: number;
  failedFrame: number | null;
  failure: string | null;
  changedAt: string;
  /** Machine time of the finished frames. */
  milliseconds: number;
  unresolved: number;
}

export interface VersionPage {
  id: string;
  number: number;
  production: { id: string; name: string };
  shot: { id: string; code: string; brief: string };
  standing: Standing;
  /** The shot's newest version, when it is not this one. */
  newer: { id: string; number: number } | null;
  setup: Setup;
  setupDigest: string;
  kernel: string;
  /** The kernel of the program that shows the page. */
  kernelHere: string;
  quality: Quality;
  colourSpace: ColourSpace;
  channels: string;
  first: number;
  last: number;
  maker: { id: string; name: string };
  madeAt: string;
  render: RenderFacts;
  /** Finished frames as runs without gaps. */
  finished: { first: number; last: number }[];
  seal: { digest: string; bytes: number; sealedAt: string } | null;
  sent: { at: string; by: string; words: string } | null;
  history: { at: string; sentence: string }[];
  /** The setup in plain sentences. */
  setupFacts: string[];
  viewer: {
    timeZone: string;
    role: Role | null;
    mayCancel: boolean;
    mayResume: boolean;
    maySend: boolean;
    mayGiveVerdict: boolean;
    mayWithdraw: boolean;
  };
}
