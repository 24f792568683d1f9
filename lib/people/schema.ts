// What forms about people ask for, checked alike in the browser and on the server.
import { z } from "zod";

export const emailSchema = z
  .string()
  .trim()
  .toLowerCase()
  .pipe(z.email("This is not an e-mail address.").max(254, "An e-mail address has at most 254 characters."));

export const credentialsSchema = z.object({
  email: emailSchema,
  password: z.string().min(1, "Write your password.").max(200, "A password has at most 200 characters."),
});
