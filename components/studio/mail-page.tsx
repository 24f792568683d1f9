import { Fragment } from "react";
import { RowLink } from "../table/row-link";
import { Cell, HeadCell, Row, Table } from "../table/table";
import { Empty } from "../empty/empty";
import { momentOf } from "./moments";
import { StudioPage, type StudioPlace } from "./studio-page";
import { splitLinks } from "./split-links";
import { capitalised, countOf } from "../words/number-words";

export interface Letter {
  id: string;
  receivedAt: string;
  messageId: string;
  from: string;
  to: string[];
  subject: string;
  text: string;
}

export interface MailPageProps {
  letters: Letter[];
  total: number;
  /** The letter that is open. */
  open: Letter | undefined;
  timeZone: string;
  places: StudioPlace[];
}

/** What the local mail server was sent: in local use, letters end here. */
export function MailPage({ letters, total, open, timeZone, places }: MailPageProps) {
  return (
    <StudioPage title={titleOf(letters.length, total)} places={places}>
      {letters.length === 0 ? (
        <Empty title="No letter has been sent yet." className="mt-36">
          Invitations, new passwords and notices arrive here within a few seconds.
        </Empty>
      ) : (
        <div className="mt-24 grid gap-48 lg:grid-cols-2 lg:gap-72">
          <div className="min-w-0 max-lg:order-last">
            <Letters letters={letters} open={open} timeZone={timeZone} />
          </div>
          {open && <OpenLetter letter={open} timeZone={timeZone} />}
        </div>
      )}
    </StudioPage>
  );
}

function titleOf(shown: number, total: number): string {
  const all = capitalised(`${countOf(total, "letter", "letters")}, kept on this machine.`);
  return shown < total ? `${all} The newest ${shown}:` : all;
}

function Letters({ letters, open, timeZone }: Pick<MailPageProps, "letters" | "open" | "timeZone">) {
  return (
    <Table aria-label="Letters, newest first">
      <thead>
        <tr>
          <HeadCell>subject</HeadCell>
          <HeadCell>time</HeadCell>
        </tr>
      </thead>
      <tbody>
        {letters.map(({ id, subject, to, receivedAt }) => (
          <Row key={id} chosen={id === open?.id}>
            <Cell className="py-8">
              <RowLink href={`/studio/mail?letter=${id}`} aria-current={id === open?.id ? "true" : undefined}>
                {subject}
              </RowLink>
              <span className="type-small block break-all text-soft">{to.join(", ")}</span>
            </Cell>
            <Cell className="type-figure-small text-soft">
              <time dateTime={receivedAt}>{momentOf(receivedAt, timeZone)}</time>
            </Cell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}

function OpenLetter({ letter, timeZone }: { letter: Letter; timeZone: string }) {
  const { subject, from, to, receivedAt, text, messageId } = letter;
  return (
    <article aria-labelledby="letter" className="min-w-0">
      <h2 id="letter" className="type-heading text-text">
        {subject}
      </h2>
      <p className="type-label section-line mt-4 text-soft">
        From {from} to {to.join(", ")},{" "}
        <span className="type-figure-small">{momentOf(receivedAt, timeZone)}</span>
      </p>
      <p className="type-prose mt-16 break-words whitespace-pre-wrap text-text">
        {splitLinks(text).map((part, index) =>
          part.href ? (
            <a key={index} href={part.href} className="action break-all">
              {part.text}
            </a>
          ) : (
            <Fragment key={index}>{part.text}</Fragment>
          ),
        )}
      </p>
      <p className="type-figure-small mt-24 break-all text-soft">Message-ID {messageId}</p>
    </article>
  );
}
