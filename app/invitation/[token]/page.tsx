import type { Metadata } from "next";
import { Invitation } from "@/components/sign-in/invitation";
import { ShutLink } from "@/components/sign-in/shut-link";
import { currentActor } from "@/lib/auth/session";
import { openInvitation } from "@/lib/people/open-invitation";
import { openLink } from "../../open-link";
import { Shell } from "../../shell";

export const metadata: Metadata = { title: "Invitation" };

export default async function InvitationPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const link = await openLink(openInvitation, token);
  const actor = await currentActor();
  return (
    <Shell native="desk">
      {"words" in link ? (
        <ShutLink words={link.words} />
      ) : (
        <Invitation token={token} invitation={link.opened} signedIn={actor ?? undefined} />
      )}
    </Shell>
  );
}
