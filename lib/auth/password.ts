import { randomBytes } from "node:crypto";
import { hash, verify } from "@node-rs/argon2";

// Argon2id at the library's defaults (19 MiB, two passes), which are OWASP's minimum for it.
export const hashPassword = (password: string): Promise<string> => hash(password);

let decoy: Promise<string> | undefined;

/** Whether the password is the one hashed. Without a hash it spends the same work and says no, so that time tells nothing. */
export async function verifyPassword(passwordHash: string | undefined, password: string): Promise<boolean> {
  decoy ??= hash(randomBytes(32).toString("base64url"));
  const matches = await verify(passwordHash ?? (await decoy), password);
  return passwordHash !== undefined && matches;
}
