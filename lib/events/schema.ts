import { z } from "zod";

/** Which log: a production's, or the studio's own. */
export const readLogInput = z.object({
  production: z.union([z.uuid(), z.literal("studio")], "Choose a production's log, or the studio's."),
  /** Lines before this one; the newest when left out. */
  before: z.coerce.number().int().min(1).optional(),
});

export const exportLogInput = readLogInput.pick({ production: true });
