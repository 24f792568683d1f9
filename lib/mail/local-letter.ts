import { z } from "zod";

/** A letter as the local mail server keeps it: one JSON file each. */
export const localLetterSchema = z.object({
  id: z.string(),
  receivedAt: z.string(),
  messageId: z.string(),
  from: z.string(),
  to: z.array(z.string()),
  subject: z.string(),
  text: z.string(),
  html: z.string(),
});

export type LocalLetter = z.infer<typeof localLetterSchema>;
