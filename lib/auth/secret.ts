/** The one secret that sessions and e-mailed links hang on. Its owner must keep it: a new one ends every session. */
export function studioSecret(): string {
  const secret = process.env.NEXTAUTH_SECRET;
  if (secret && secret.length >= 32) return secret;
  throw new Error("NEXTAUTH_SECRET is missing or shorter than 32 characters.");
}
