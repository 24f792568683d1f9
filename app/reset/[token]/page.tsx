import type { Metadata } from "next";
import { NewPasswordForm } from "@/components/sign-in/new-password-form";
import { ShutLink } from "@/components/sign-in/shut-link";
import { Threshold } from "@/components/sign-in/threshold";
import { openReset } from "@/lib/people/reset-password";
import { openLink } from "../../open-link";
import { Shell } from "../../shell";

export const metadata: Metadata = { title: "A new password" };

export default async function ResetPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const link = await openLink(openReset, token);
  return (
    <Shell native="desk">
      {"words" in link ? (
        <ShutLink words={link.words} again />
      ) : (
        <Threshold
          title="A new password."
          words={`For ${link.opened.email}. Every session under the old one ends.`}
        >
          <NewPasswordForm token={token} email={link.opened.email} />
        </Threshold>
      )}
    </Shell>
  );
}
