import { sayBytes } from "@/lib/deliveries/schema-bytes";
import type { DeliveryPage } from "@/lib/deliveries/schema-pages";
import { Standing } from "../standing/standing";
import { dayOf, momentOf } from "../studio/moments";
import { Cell, FigureCell, HeadCell, Row, Table } from "../table/table";

type Props = Pick<DeliveryPage, "recipients" | "downloads"> & { timeZone: string };

/** Whom it was published to, what they signed, and everything that was taken. */
export function RecipientTable({ recipients, downloads, timeZone }: Props) {
  return (
    <>
      <h2 className="type-heading mt-48 text-text">Who has it</h2>
      <ul className="mt-8 border-t border-text">
        {recipients.map((one) => (
          <li key={one.personId} className="grid gap-4 border-b border-hair py-12">
            <p className="flex flex-wrap items-baseline justify-between gap-12">
              <span className="type-body text-text">{one.name}</span>
              {one.receipt ? (
                <Standing standing={one.receipt} />
              ) : (
                <span className="type-label text-soft">
                  open until {dayOf(one.expiresAt, timeZone)}; no receipt yet
                </span>
              )}
            </p>
            {one.statement && (
              <p className="type-note max-w-640 break-words text-soft">
                “{one.statement}”{" "}
                {one.signedAt && <span className="type-label">{momentOf(one.signedAt, timeZone)}</span>}
              </p>
            )}
          </li>
        ))}
      </ul>
      <h2 className="type-heading mt-48 text-text">What was taken</h2>
      {downloads.length === 0 ? (
        <p className="type-label mt-8 text-soft">Nothing has been taken yet.</p>
      ) : (
        <Table className="mt-8">
          <caption className="sr-only">Downloads, the newest first</caption>
          <thead>
            <tr>
              <HeadCell>who</HeadCell>
              <HeadCell>what</HeadCell>
              <HeadCell className="text-right">bytes</HeadCell>
              <HeadCell className="text-right">begun</HeadCell>
            </tr>
          </thead>
          <tbody>
            {downloads.map((line) => (
              <Row key={line.id}>
                <Cell className="whitespace-nowrap">{line.name}</Cell>
                <Cell className="break-all">{line.what}</Cell>
                <FigureCell>{line.finishedAt ? sayBytes(line.bytes) : "not finished"}</FigureCell>
                <FigureCell>{momentOf(line.startedAt, timeZone)}</FigureCell>
              </Row>
            ))}
          </tbody>
        </Table>
      )}
    </>
  );
}
