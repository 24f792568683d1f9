import { signIn } from "next-auth/react";

const refused =
  "This e-mail address and password do not belong together. Check both, or ask for a new password.";

/** Signs in and leads on with a fresh page; otherwise says in words why not. */
export async function admit(
  credentials: { email: string; password: string },
  next: string,
): Promise<string | null> {
  const answer = await signIn("credentials", { ...credentials, redirect: false, callbackUrl: next });
  if (answer?.ok && !answer.error) {
    window.location.assign(next);
    return null;
  }
  return !answer?.error || answer.error === "CredentialsSignin" ? refused : answer.error;
}
