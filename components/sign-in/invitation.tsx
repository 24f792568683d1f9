import { JoinKnownForm } from "./join-known-form";
import { JoinNewForm } from "./join-new-form";
import { Threshold } from "./threshold";

export interface InvitationProps {
  token: string;
  invitation: {
    production: string;
    role: string;
    by: string;
    email: string;
    name: string;
    personId: string | null;
  };
  /** The account the reader is signed in to, if any. */
  signedIn?: { id: string; name: string } | undefined;
}

const roleWords: Record<string, string> = {
  artist: "an artist",
  advisor: "its science advisor",
  producer: "a producer",
  client: "a client",
};

export function Invitation({ token, invitation, signedIn }: InvitationProps) {
  const { production, role, by, email, name, personId } = invitation;
  const isReader = signedIn !== undefined && signedIn.id === personId;
  const elsewhere =
    signedIn && !isReader ? ` You are signed in as ${signedIn.name} now; accepting signs you in anew.` : "";
  return (
    <Threshold
      title={`Join ${production}.`}
      words={`${by} invites you as ${roleWords[role] ?? role}. ${whatNext(email, personId !== null, isReader)}${elsewhere}`}
    >
      {personId === null ? (
        <JoinNewForm token={token} email={email} name={name} />
      ) : (
        <JoinKnownForm token={token} email={email} signedIn={isReader} />
      )}
    </Threshold>
  );
}

function whatNext(email: string, known: boolean, isReader: boolean): string {
  if (!known) return `This makes an account for ${email}.`;
  return isReader
    ? `You are signed in as ${email}, the address that is invited.`
    : `${email} has an account, so its password is asked.`;
}
