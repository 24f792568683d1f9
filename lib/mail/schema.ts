import { z } from "zod";

/** A letter in plain sentences: what happened, and at most one link to act on. */
export const mailPayloadSchema = z.object({
  to: z.string(),
  subject: z.string(),
  /** Paragraphs of plain text. */
  paragraphs: z.array(z.string()).min(1),
  action: z
    .object({
      label: z.string(),
      path: z.string().startsWith("/"),
      /** The id of a single-use link: its token is put behind the path when the letter is written, and kept nowhere. */
      link: z.uuid().optional(),
    })
    .optional(),
});

export type MailPayload = z.infer<typeof mailPayloadSchema>;
