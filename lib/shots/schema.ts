import { z } from "zod";
import { holds } from "@/db/enums";
import { shotOrders, standings, type Standing } from "./schema-standing";

const productionId = z.uuid("This is not the id of a production.");
const personId = z.uuid("This is not the id of a person.");

const dateSchema = z.iso
  .date("A date as 2031-10-20.")
  .refine((date) => date >= "2000-01-01" && date < "2200-01-01", {
    error: "A date between 2000 and 2199.",
  });

export const shotCodeSchema = z
  .string()
  .trim()
  .toUpperCase()
  .max(24, "A shot code has at most 24 characters.")
  .regex(/^[A-Z0-9]+(-[A-Z0-9]+)+$/, "Capital letters and figures in parts joined by hyphens, as AB-010.");

const briefSchema = z
  .string()
  .trim()
  .min(1, "Say in a sentence what the shot shows.")
  .max(300, "A brief has at most 300 characters.");

export const createSequenceInput = z.object({
  production: productionId,
  name: z
    .string()
    .trim()
    .min(1, "Name the sequence.")
    .max(80, "A sequence's name has at most 80 characters."),
});

export const createShotInput = z.object({
  production: productionId,
  sequence: z.uuid("Choose a sequence."),
  code: shotCodeSchema,
  brief: briefSchema,
  dueOn: dateSchema.nullable(),
  artist: personId.nullable(),
});
export type CreateShotInput = z.infer<typeof createShotInput>;

export const shotChangeSchema = z.discriminatedUnion(
  "what",
  [
    z.object({ what: z.literal("due"), dueOn: dateSchema.nullable() }),
    z.object({ what: z.literal("artist"), artist: personId.nullable() }),
    z.object({ what: z.literal("brief"), brief: briefSchema }),
    z.object({ what: z.literal("hold"), hold: z.enum(holds, { error: "none, on hold or omitted." }) }),
  ],
  { error: "Say what changes: due, artist, brief or hold." },
);
export type ShotChange = z.infer<typeof shotChangeSchema>;

export const changeShotsInput = z.object({
  shots: z
    .array(z.uuid("This is not the id of a shot."))
    .min(1, "Choose a shot.")
    .max(500, "At most 500 shots at once."),
  change: shotChangeSchema,
});

export const listShotsInput = z.object({
  /** Left out: the first production the reader belongs to. */
  production: productionId.optional(),
  standing: z.enum(standings).optional(),
  /** A person's id, "nobody" or "queue"; left out, anyone. */
  holder: z.union([personId, z.literal("nobody"), z.literal("queue")]).optional(),
  order: z.enum(shotOrders).default("sequence"),
});

export const shotIdInput = z.object({ shot: z.uuid("This is not the id of a shot.") });

/** Who has a shot: a person, the render queue, or nobody. */
export type Holder = { kind: "person"; id: string; name: string } | { kind: "queue" } | { kind: "nobody" };

export interface ShotLine {
  id: string;
  code: string;
  brief: string;
  standing: Standing;
  version: { id: string; number: number } | null;
  /** A finished frame to show it by. */
  picture: { versionId: string; frame: number } | null;
  holder: Holder;
  dueOn: string | null;
  /** Machine time of every frame of every version, in milliseconds. */
  milliseconds: number;
}

export interface ShotGroup {
  id: string;
  number: number;
  name: string;
  /** How many shots the sequence has in all, shown or not. */
  shotCount: number;
  shots: ShotLine[];
}

export interface ShotList {
  production: { id: string; code: string; name: string };
  productions: { id: string; name: string }[];
  /** The reader's date, as 2031-10-20. */
  today: string;
  /** Grouped by sequence; in any other order than by sequence, one group without a name. */
  groups: ShotGroup[];
  sequences: { id: string; number: number; name: string }[];
  totals: { shots: number; asking: number; late: number; milliseconds: number };
  holders: { id: string; name: string }[];
  artists: { id: string; name: string }[];
  mayChange: boolean;
}
