import type { DoorPage } from "@/lib/deliveries/schema-pages";
import { Figure } from "../figure/figure";
import { Message } from "../message/message";
import { dayOf } from "../studio/moments";

interface ScienceNoteProps {
  contents: NonNullable<DoorPage["contents"]>;
  timeZone: string;
}

/** The science note in short, who signed, what to be careful of, and the whole of it. */
export function ScienceNote({ contents, timeZone }: ScienceNoteProps) {
  const { summary, note, caution, sets } = contents;
  return (
    <section aria-labelledby="note">
      <h2 id="note" className="type-heading text-text">
        Science note
      </h2>
      <p className="type-prose mt-8 text-text">{summary}</p>
      <div className="type-label mt-12 grid gap-2 text-soft">
        {signers(contents).map(({ advisor, signedAt, codes }) => (
          <p key={`${advisor} ${signedAt}`}>
            {sets.length > 1 && <Figure>{codes.join(", ")}: </Figure>}
            Signed off by {advisor}, science advisor, <Figure>{dayOf(signedAt, timeZone)}</Figure>.
          </p>
        ))}
      </div>
      <Message bare kind="work" announce={false} className="mt-16">
        {caution}
      </Message>
      <details className="mt-12">
        <summary className="type-label cursor-pointer text-text underline decoration-edge underline-offset-4">
          Read it all
        </summary>
        <pre className="type-figure-small mt-12 whitespace-pre-wrap text-text">{note}</pre>
      </details>
    </section>
  );
}

interface Signed {
  advisor: string;
  signedAt: string;
  codes: string[];
}

/** Sets that one advisor signed on one day are named together. */
function signers({ sets }: ScienceNoteProps["contents"]): Signed[] {
  const signed: Signed[] = [];
  for (const { advisor, signedAt, shotCode } of sets) {
    const same = signed.find(
      (one) => one.advisor === advisor && one.signedAt.slice(0, 10) === signedAt.slice(0, 10),
    );
    if (same) same.codes.push(shotCode);
    else signed.push({ advisor, signedAt, codes: [shotCode] });
  }
  return signed;
}
