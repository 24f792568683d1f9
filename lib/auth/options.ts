// How a person signs in and what a session carries: who, and the epoch after which it no longer counts.
import { randomUUID } from "node:crypto";
import type { NextAuthOptions, User } from "next-auth";
import CredentialsProvider from "next-auth/providers/credentials";
import { database } from "../database";
import { DomainError } from "../errors";
import { log } from "../log";
import { checkCredentials } from "../people/check-credentials";
import { credentialsSchema } from "../people/schema";
import { clientAddress } from "./client-address";
import { studioSecret } from "./secret";

const oneWeek = 7 * 24 * 60 * 60;

/** Made on each request, so that building the program needs no secret. */
export function authOptions(): NextAuthOptions {
  return {
    secret: studioSecret(),
    session: { strategy: "jwt", maxAge: oneWeek },
    pages: { signIn: "/sign-in", signOut: "/sign-in", error: "/sign-in" },
    providers: [
      CredentialsProvider({
        name: "e-mail and password",
        credentials: { email: { type: "email" }, password: { type: "password" } },
        authorize: (credentials, request) => admit(credentials, request.headers),
      }),
    ],
    callbacks: {
      jwt: ({ token, user }) => (user ? { ...token, personId: user.id, epoch: user.epoch } : token),
      session: ({ session, token }) => ({ ...session, personId: token.personId, epoch: token.epoch }),
    },
  };
}

// next-auth shows an error's message to whoever signs in, so only words meant for them may leave here.
async function admit(
  credentials: unknown,
  headers: Record<string, unknown> | undefined,
): Promise<User | null> {
  const parsed = credentialsSchema.safeParse(credentials);
  if (!parsed.success) return null;
  try {
    return await checkCredentials(database(), { ...parsed.data, from: clientAddress(headers) });
  } catch (error) {
    if (error instanceof DomainError) throw error;
    const faultId = randomUUID();
    log.error({ requestId: faultId, err: error }, "fault while signing in");
    throw new Error(`Something failed on our side. It is in the log as ${faultId}.`, { cause: error });
  }
}
