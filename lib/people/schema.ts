// What forms about people ask for, checked alike in the browser and on the server.
import { z } from "zod";
import { roles } from "@/db/enums";

export const emailSchema = z
  .string("Write an e-mail address.")
  .trim()
  .toLowerCase()
  .max(254, "An e-mail address has at most 254 characters.")
  .pipe(z.email("This is not an e-mail address."));

export const nameSchema = z
  .string("Write a name.")
  .trim()
  .min(1, "Write a name.")
  .max(80, "A name has at most 80 characters.");

/** Length is what makes a password hard to guess, so length is all that is asked. */
export const passwordSchema = z
  .string("Write a password.")
  .min(12, "A password has at least 12 characters. Four unrelated words do well.")
  .max(200, "A password has at most 200 characters.");

export const timeZoneSchema = z
  .string("Choose a time zone.")
  .refine(isTimeZone, "There is no such time zone. Write one as Europe/Oslo or UTC.");

export const roleSchema = z.enum(roles, `Choose a role: ${roles.join(", ")}.`);

// Any text is let through: what is wrong with a link is said by the verb, in words.
const tokenSchema = z.string("The link is missing.").max(500, "This is not one of our links.");

export const credentialsSchema = z.object({
  email: emailSchema,
  password: z
    .string("Write your password.")
    .min(1, "Write your password.")
    .max(200, "A password has at most 200 characters."),
});

export const inviteInput = z.object({
  productionId: z.uuid("Choose a production."),
  email: emailSchema,
  name: nameSchema,
  role: roleSchema,
});

export const revokeInput = z.object({ invitation: z.uuid("Which invitation?") });
export const linkInput = z.object({ token: tokenSchema });

/** For someone who has no account yet. */
export const joinAsNewInput = z.object({
  token: tokenSchema,
  name: nameSchema,
  password: passwordSchema,
  timeZone: timeZoneSchema,
});

/** For someone whose address has an account: its password, unless they are signed in to it. */
export const joinAsKnownInput = z.object({ token: tokenSchema, password: z.string().max(200).optional() });

export const askForResetInput = z.object({ email: emailSchema });
export const resetPasswordInput = z.object({ token: tokenSchema, password: passwordSchema });

export const removePersonInput = z.object({
  production: z.uuid("Which production?"),
  person: z.uuid("Which person?"),
});
export const closeAccountInput = z.object({ person: z.uuid("Which person?") });

function isTimeZone(zone: string): boolean {
  try {
    new Intl.DateTimeFormat("en", { timeZone: zone });
    return true;
  } catch {
    return false;
  }
}
