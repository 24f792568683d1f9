import { figureIn, sayBytes, unitFor } from "@/lib/deliveries/schema-bytes";
import type { DeliveredSet } from "@/lib/deliveries/schema-pages";
import type { ReactNode } from "react";
import { Cell, FigureCell, HeadCell, Row, Table } from "../table/table";

export interface ContentsTableProps {
  sets: DeliveredSet[];
  texts: { path: string; bytes: number }[];
  /** What can be taken of a set or of the texts, beside its row. */
  actOf?: (set: DeliveredSet) => ReactNode;
}

const manifest = "manifest-sha256.txt";

/** What is in a delivery: each set with its frames and size in one unit, the texts, and the manifest. */
export function ContentsTable({ sets, texts, actOf }: ContentsTableProps) {
  const unit = unitFor(Math.max(...sets.map(({ bytes }) => bytes), 1));
  const notes = texts.filter(({ path }) => path !== manifest);
  const listed = texts.filter(({ path }) => path === manifest);
  const sizeOf = (bytes: number) =>
    bytes < unit.size ? sayBytes(bytes) : `${figureIn(bytes, unit.size)} ${unit.name}`;
  // The column of acts is left out on a phone, and the sizes end the row there.
  const lastOnPhone = actOf ? "max-md:pr-0" : "";
  return (
    <Table>
      <caption className="sr-only">What is in the delivery</caption>
      <thead>
        <tr>
          <HeadCell>set</HeadCell>
          <HeadCell className="hidden sm:table-cell">version</HeadCell>
          <HeadCell>frames</HeadCell>
          <HeadCell className="text-right">files</HeadCell>
          <HeadCell className="hidden sm:table-cell">format</HeadCell>
          <HeadCell className={`text-right ${lastOnPhone}`}>size</HeadCell>
          {actOf && <HeadCell className="hidden md:table-cell">alone</HeadCell>}
        </tr>
      </thead>
      <tbody>
        {sets.map((set) => (
          <Row key={set.version}>
            <Cell className="type-figure font-medium whitespace-nowrap">{set.shotCode}</Cell>
            <Cell className="hidden whitespace-nowrap sm:table-cell">version {set.number}</Cell>
            <Cell className="type-figure whitespace-nowrap">
              {set.first === set.last ? set.first : `${set.first}–${set.last}`}
            </Cell>
            <FigureCell>{set.files}</FigureCell>
            <Cell className="hidden text-soft sm:table-cell">{set.format}</Cell>
            <FigureCell className={lastOnPhone}>{sizeOf(set.bytes)}</FigureCell>
            {actOf && <Cell className="hidden md:table-cell">{actOf(set)}</Cell>}
          </Row>
        ))}
        {[
          { name: "Science note, setups, how to check", files: notes, format: "text" },
          { name: "Manifest", files: listed, format: "SHA-256" },
        ].map(({ name, files, format }) => (
          <Row key={name}>
            <Cell colSpan={2} className="sm:hidden">
              {name}
            </Cell>
            <Cell colSpan={3} className="hidden pl-0 sm:table-cell">
              {name}
            </Cell>
            <FigureCell>{files.length}</FigureCell>
            <Cell className="hidden text-soft sm:table-cell">{format}</Cell>
            <FigureCell className={lastOnPhone}>
              {sizeOf(files.reduce((sum, { bytes }) => sum + bytes, 0))}
            </FigureCell>
            {actOf && <Cell className="hidden md:table-cell" />}
          </Row>
        ))}
      </tbody>
    </Table>
  );
}
