import { TextLink } from "../button/text-action";
import { Empty } from "../empty/empty";
import { Message } from "../message/message";
import { Cell, HeadCell, Row, Table } from "../table/table";
import { momentOf } from "./moments";
import { StudioPage, type StudioPlace } from "./studio-page";

export interface LogPageProps {
  chain: string;
  name: string;
  logs: { id: string; name: string }[];
  total: number;
  brokenAt: number | null;
  lines: { seq: number; at: string; sentence: string; hash: string }[];
  /** The line before which older ones are read; null at the beginning. */
  older: number | null;
  timeZone: string;
  places: StudioPlace[];
}

/** A production's log, newest first, with what the chain of hashes says of it. */
export function LogPage(props: LogPageProps) {
  const { chain, name, logs, lines, older, timeZone, places } = props;
  return (
    <StudioPage title={`What happened: ${name}`} places={places}>
      {logs.length > 1 && <LogChoice logs={logs} chain={chain} />}
      <div className="mt-24 flex flex-wrap items-center gap-x-24 gap-y-12">
        <ChainState {...props} />
        <a href={`/api/log?production=${chain}`} download className="action type-label">
          Take the whole log as text
        </a>
      </div>
      {lines.length === 0 ? (
        <Empty title="Nothing has happened here yet." className="mt-36">
          Each thing that is done in this production becomes a line.
        </Empty>
      ) : (
        <Lines lines={lines} timeZone={timeZone} />
      )}
      <nav aria-label="Other lines" className="type-label mt-24 flex gap-16">
        {older && <TextLink href={`/studio/log?production=${chain}&before=${older}`}>Older lines</TextLink>}
        {lines[0] && lines[0].seq < props.total && (
          <TextLink href={`/studio/log?production=${chain}`}>Newest lines</TextLink>
        )}
      </nav>
    </StudioPage>
  );
}

function LogChoice({ logs, chain }: Pick<LogPageProps, "logs" | "chain">) {
  return (
    <nav aria-label="Logs" className="type-label mt-12 flex flex-wrap gap-x-16 gap-y-8">
      {logs.map(({ id, name }) =>
        id === chain ? (
          <span key={id} aria-current="page" className="text-soft">
            {name}
          </span>
        ) : (
          <TextLink key={id} href={`/studio/log?production=${id}`}>
            {name}
          </TextLink>
        ),
      )}
    </nav>
  );
}

function ChainState({ total, brokenAt }: LogPageProps) {
  if (brokenAt !== null)
    return (
      <Message kind="work" announce={false}>
        The chain is broken at line {brokenAt}: it, or a line before it, is not as it was written. Compare
        with an earlier text of this log.
      </Message>
    );
  return (
    <Message kind="settled" announce={false}>
      The chain is whole: {total} {total === 1 ? "line" : "lines"}, each carrying the hash of the one before.
    </Message>
  );
}

function Lines({ lines, timeZone }: Pick<LogPageProps, "lines" | "timeZone">) {
  return (
    <Table className="mt-24" aria-label="Lines of the log, newest first">
      <thead>
        <tr>
          <HeadCell className="text-right max-sm:hidden">line</HeadCell>
          <HeadCell className="max-sm:pl-0">time in {timeZone}</HeadCell>
          <HeadCell>what happened</HeadCell>
          <HeadCell className="text-right max-md:hidden">hash</HeadCell>
        </tr>
      </thead>
      <tbody>
        {lines.map(({ seq, at, sentence, hash }) => (
          <Row key={seq}>
            <Cell className="type-figure w-48 text-right text-soft max-sm:hidden">{seq}</Cell>
            <Cell className="type-figure-small w-186 text-soft max-sm:pl-0 sm:whitespace-nowrap">
              <time dateTime={at}>{momentOf(at, timeZone)}</time>
            </Cell>
            <Cell className="py-8 break-words">{sentence}</Cell>
            <Cell className="type-figure-small text-right text-soft max-md:hidden" title={hash}>
              {hash.slice(0, 8)}
            </Cell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}
