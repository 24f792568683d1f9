"use client";

import { signOut } from "next-auth/react";
import { TextAction } from "../button/text-action";

/** The way out, for the top bar. */
export function SignOut() {
  return (
    <TextAction className="text-soft" onClick={() => void signOut({ callbackUrl: "/sign-in" })}>
      Sign out
    </TextAction>
  );
}
