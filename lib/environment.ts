// What the process is told from outside, checked once. `npm start` makes every value for local use.
import { z } from "zod";

const environmentSchema = z.object({
  DATABASE_URL: z.string().min(1),
  NEXTAUTH_URL: z.url().default("http://127.0.0.1:3000"),
  STORAGE_DIR: z.string().min(1).default(".data/storage"),
  /** An S3 bucket instead of the folder, when all of it is set. */
  S3_BUCKET: z.string().optional(),
  S3_ENDPOINT: z.string().optional(),
  S3_REGION: z.string().default("us-east-1"),
  SMTP_URL: z.string().optional(),
  MAIL_FROM: z.string().default("Ringwright <studio@ringwright.example>"),
  /** Where the local mail server keeps what it was sent; only in local use. */
  MAIL_DIR: z.string().default(".data/mail"),
  REDIS_URL: z.string().optional(),
  RINGWRIGHT_LOCAL: z.enum(["0", "1"]).default("0"),
  LOG_LEVEL: z.string().default("info"),
});

export type Environment = z.infer<typeof environmentSchema>;

let checked: Environment | undefined;

/** The checked environment; throws once, naming every variable that is missing or wrong. */
export function environment(): Environment {
  if (checked) return checked;
  const result = environmentSchema.safeParse(process.env);
  if (result.success) return (checked = result.data);
  const faults = result.error.issues.map((issue) => `${issue.path.join(".")}: ${issue.message}`).join("; ");
  throw new Error(`The environment is not complete. ${faults}`);
}
