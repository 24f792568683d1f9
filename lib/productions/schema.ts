import { z } from "zod";
import { productionKinds } from "@/db/enums";

export const createProductionInput = z.object({
  code: z
    .string("Write a code.")
    .trim()
    .toUpperCase()
    .regex(/^[A-Z][A-Z0-9]{1,7}$/, "A code is a letter and one to seven more letters or figures, as LH."),
  name: z
    .string("Write a name.")
    .trim()
    .min(1, "Write the production's name.")
    .max(80, "A production's name has at most 80 characters."),
  kind: z.enum(productionKinds, "Choose film or dome."),
});
