import { sayBytes } from "@/lib/deliveries/schema-bytes";
import type { DeliveryLine, DoorLine } from "@/lib/deliveries/schema-pages";
import { LinkButton } from "../button/link-button";
import { Empty } from "../empty/empty";
import { LivePage } from "../live/live-page";
import { Standing } from "../standing/standing";
import { dayOf } from "../studio/moments";
import { RowLink } from "../table/row-link";
import { Cell, FigureCell, HeadCell, Row, Table } from "../table/table";
import { capitalised, countOf } from "../words/number-words";
import { DoorList } from "./door-list";

export interface DeliveriesPageProps {
  /** What a member of the studio sees; null for someone who is only a client. */
  lines: DeliveryLine[] | null;
  doors: DoorLine[];
  /** The productions in which the reader may assemble a delivery. */
  assembles: { id: string; name: string }[];
  timeZone: string;
}

/** The studio's deliveries and where each stands; for a client, the doors that stand open to them. */
export function DeliveriesPage({ lines, doors, assembles, timeZone }: DeliveriesPageProps) {
  return (
    <div className="mx-auto w-full max-w-1920 px-16 pt-24 pb-72 sm:px-48">
      <LivePage />
      <div className="flex flex-wrap items-start justify-between gap-x-24 gap-y-12">
        <h1 className="type-title text-text max-sm:text-[1.875rem] max-sm:leading-38">
          {sayTitle(lines, doors)}
        </h1>
        <div className="flex flex-wrap gap-12 pt-8">
          {assembles.map(({ id, name }) => (
            <LinkButton key={id} href={`/deliveries/new?production=${id}`} look="primary">
              {assembles.length > 1 ? `Assemble a delivery of ${name}` : "Assemble a delivery"}
            </LinkButton>
          ))}
        </div>
      </div>
      {(lines === null || doors.length > 0) && <DoorList doors={doors} timeZone={timeZone} />}
      {lines?.length === 0 && (
        <Empty title="No delivery has been made yet." className="mt-24">
          A producer assembles one from versions that the science advisor has signed off.
        </Empty>
      )}
      {lines && lines.length > 0 && <Lines lines={lines} timeZone={timeZone} />}
    </div>
  );
}

function sayTitle(lines: DeliveryLine[] | null, doors: DoorLine[]): string {
  if (lines === null) {
    const waiting = doors.filter(({ receipt, stopped }) => receipt === null && !stopped).length;
    return waiting === 0
      ? "Nothing waits to be taken."
      : `${capitalised(countOf(waiting, "delivery waits", "deliveries wait"))} for you.`;
  }
  const standing = lines.filter(({ withdrawnAt }) => withdrawnAt === null);
  const open = standing.filter(({ publishedAt }) => publishedAt === null).length;
  const made = capitalised(countOf(standing.length, "delivery", "deliveries"));
  return open === 0 ? `${made}.` : `${made}; ${countOf(open, "is", "are")} not published.`;
}

function Lines({ lines, timeZone }: { lines: DeliveryLine[]; timeZone: string }) {
  return (
    <>
      <Table className="mt-36 hidden md:table">
        <caption className="sr-only">Deliveries, the newest first</caption>
        <thead>
          <tr>
            <HeadCell className="text-right">number</HeadCell>
            <HeadCell>title</HeadCell>
            <HeadCell>production</HeadCell>
            <HeadCell>standing</HeadCell>
            <HeadCell className="text-right">files</HeadCell>
            <HeadCell className="text-right">size</HeadCell>
            <HeadCell>to</HeadCell>
            <HeadCell className="text-right">made</HeadCell>
          </tr>
        </thead>
        <tbody>
          {lines.map((line) => (
            <Row key={line.id} faint={line.withdrawnAt !== null}>
              <FigureCell>{line.number}</FigureCell>
              <Cell>
                <RowLink href={`/deliveries/${line.id}`} className="type-note">
                  {line.title}
                </RowLink>
              </Cell>
              <Cell>{line.production}</Cell>
              <Cell>
                <LineStanding line={line} />
              </Cell>
              <FigureCell>{line.files}</FigureCell>
              <FigureCell>{sayBytes(line.bytes)}</FigureCell>
              <Cell>{line.recipients.join(", ") || "nobody yet"}</Cell>
              <FigureCell>{dayOf(line.madeAt, timeZone)}</FigureCell>
            </Row>
          ))}
        </tbody>
      </Table>
      <ul className="mt-24 border-t border-text md:hidden">
        {lines.map((line) => (
          <li key={line.id} className="grid gap-4 border-b border-hair py-12">
            <RowLink href={`/deliveries/${line.id}`} className="type-prose">
              {line.number}. {line.title}
            </RowLink>
            <LineStanding line={line} />
            <span className="type-label text-soft">
              {line.files} files, {sayBytes(line.bytes)}; to {line.recipients.join(", ") || "nobody yet"}
            </span>
          </li>
        ))}
      </ul>
    </>
  );
}

/** A delivery that is made and not published stands as its frames do, and says what it lacks. */
function LineStanding({ line }: { line: DeliveryLine }) {
  if (line.standing === null) return <span className="text-soft">withdrawn</span>;
  return (
    <span className="inline-flex flex-wrap items-center">
      <Standing standing={line.standing} />
      {line.publishedAt === null && line.standing === "signed off" && (
        <span className="text-soft">, not published</span>
      )}
    </span>
  );
}
