// What the delivery verbs take. Free of Drizzle: shared with the forms.
import { z } from "zod";
import { fileKinds, receiptKinds } from "@/db/enums";

export const layouts = ["by shot", "by format"] as const;
export type Layout = (typeof layouts)[number];

export const separators = [".", "_"] as const;
export type Separator = (typeof separators)[number];

export const defaultDays = 7;
export const longestDays = 90;

const words = z.string().trim().max(4000, "At most 4,000 characters.");

export const deliveryIdSchema = z.object({ delivery: z.uuid({ error: "The id of a delivery." }) });
export const productionIdSchema = z.object({ production: z.uuid({ error: "The id of a production." }) });

const itemSchema = z.object({
  version: z.uuid(),
  verdict: z.uuid(),
  first: z.int().min(0),
  last: z.int().min(0),
});

const choicesSchema = productionIdSchema.extend({
  items: z
    .array(itemSchema)
    .min(1, "Choose at least one signed-off version.")
    .max(500, "At most 500 versions in one delivery.")
    .refine((items) => new Set(items.map(({ version }) => version)).size === items.length, {
      error: "Each version once: to deliver two runs of it, have both signed by one verdict.",
    }),
  formats: z
    .array(z.enum(fileKinds, { error: "png or exr." }))
    .min(1, "Choose PNG, OpenEXR or both.")
    .transform((kinds) => fileKinds.filter((kind) => kinds.includes(kind))),
  layout: z.enum(layouts, { error: "By shot, or by format." }),
  separator: z.enum(separators, { error: "A dot or an underscore." }),
  /** How many figures a frame's number has in a file's name. */
  digits: z.int({ error: "A whole number from 4 to 6." }).min(4, "At least 4.").max(6, "At most 6."),
});

export const measureDeliverySchema = choicesSchema.extend({
  title: z.string().trim().max(120).default(""),
  words: words.default(""),
});

export const makeDeliverySchema = choicesSchema.extend({
  title: z
    .string()
    .trim()
    .min(1, "Give it a title the client will know.")
    .max(120, "At most 120 characters."),
  words: words.default(""),
});

export const publishDeliverySchema = deliveryIdSchema.extend({
  recipients: z
    .array(z.uuid())
    .min(1, "Choose at least one recipient.")
    .transform((ids) => [...new Set(ids)]),
  days: z
    .int({ error: `A whole number of days, 1 to ${longestDays}.` })
    .min(1, "At least one day.")
    .max(longestDays, `At most ${longestDays} days.`)
    .default(defaultDays),
});

export const withdrawDeliverySchema = deliveryIdSchema.extend({
  words: words.min(1, "Say why it is withdrawn; everyone it was published to is told."),
});

export const takeZipSchema = deliveryIdSchema.extend({
  /** A version of the delivery, when only its set is taken. */
  set: z.uuid().optional(),
});

export const takeFileSchema = deliveryIdSchema.extend({ path: z.array(z.string().max(400)).min(1).max(12) });

export const pictureSchema = deliveryIdSchema.extend({ version: z.uuid() });

export const signReceiptSchema = deliveryIdSchema
  .extend({
    kind: z.enum(receiptKinds, { error: "Received, or refused." }),
    /** The manifest's digest the client had before them. */
    manifestDigest: z.string().regex(/^[0-9a-f]{64}$/, "The manifest's digest, 64 figures."),
    words: words.default(""),
  })
  .refine(({ kind, words: said }) => kind === "received" || said !== "", {
    path: ["words"],
    error: "Say what is wrong, so that the studio can mend it.",
  });

export type MeasureDelivery = z.infer<typeof measureDeliverySchema>;
