import { z } from "zod";

/** One job of the render queue: a run of a version's frames, for one attempt at it. */
export const frameJobSchema = z.object({
  versionId: z.uuid(),
  attempt: z.number().int().min(1),
  first: z.number().int(),
  last: z.number().int(),
});

export type FrameJob = z.infer<typeof frameJobSchema>;
