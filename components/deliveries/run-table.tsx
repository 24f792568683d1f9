import { sayBytes } from "@/lib/deliveries/schema-bytes";
import type { SignedRun } from "@/lib/deliveries/schema-pages";
import { CheckBox } from "../field/check-box";
import { Digest } from "../figure/digest";
import { Cell, FigureCell, HeadCell, Row, Table } from "../table/table";

export interface ChosenRun {
  version: string;
  verdict: string;
  first: number;
  last: number;
}

export interface RunTableProps {
  runs: SignedRun[];
  /** The verdict and first frame of each chosen run. */
  chosen: string[];
  onChange: (runs: ChosenRun[]) => void;
}

const keyOf = ({ verdict, first }: ChosenRun) => `${verdict} ${first}`;

/** The runs of frames that stand signed off. Of one version only one can be in a delivery. */
export function RunTable({ runs, chosen, onChange }: RunTableProps) {
  const toggle = (run: SignedRun, on: boolean) => {
    const others = runs.filter((other) => chosen.includes(keyOf(other)) && other.version !== run.version);
    onChange(
      [...others, ...(on ? [run] : [])].map(({ version, verdict, first, last }) => ({
        version,
        verdict,
        first,
        last,
      })),
    );
  };
  return (
    <Table>
      <caption className="type-label pb-8 text-left text-soft">Signed-off frames</caption>
      <thead>
        <tr>
          <HeadCell>shot</HeadCell>
          <HeadCell>version</HeadCell>
          <HeadCell>frames</HeadCell>
          <HeadCell className="hidden text-right sm:table-cell">PNG</HeadCell>
          <HeadCell className="hidden text-right sm:table-cell">OpenEXR</HeadCell>
          <HeadCell className="hidden xl:table-cell">digest</HeadCell>
        </tr>
      </thead>
      <tbody>
        {runs.map((run) => {
          const isChosen = chosen.includes(keyOf(run));
          return (
            <Row key={keyOf(run)} chosen={isChosen}>
              <Cell>
                <CheckBox
                  label={<span className="type-figure whitespace-nowrap">{run.shotCode}</span>}
                  checked={isChosen}
                  onChange={(event) => toggle(run, event.target.checked)}
                />
              </Cell>
              <Cell>
                version {run.number}
                {run.newest > run.number && (
                  <span className="text-soft">; version {run.newest} is newer</span>
                )}
                {run.deliveredIn.length > 0 && (
                  <span className="text-soft">; in delivery {run.deliveredIn.join(" and ")} already</span>
                )}
              </Cell>
              <Cell className="type-figure whitespace-nowrap">
                {run.first}–{run.last}
              </Cell>
              <FigureCell className="hidden sm:table-cell">{sayBytes(run.pngBytes)}</FigureCell>
              <FigureCell className="hidden sm:table-cell">{sayBytes(run.exrBytes)}</FigureCell>
              <Cell className="hidden xl:table-cell">
                <Digest digest={run.digest} short />
              </Cell>
            </Row>
          );
        })}
      </tbody>
    </Table>
  );
}
