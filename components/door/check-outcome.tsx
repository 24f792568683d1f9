import { Figure } from "../figure/figure";
import { Message } from "../message/message";
import { writeReport, type CheckResult } from "./check-files";

export interface CheckOutcomeProps {
  result: CheckResult;
  at: Date;
  folder: string;
  spoken: string;
}

const named = 12;

/** What the check found: that all match, or each file that does not, by name. */
export function CheckOutcome({ result, at, folder, spoken }: CheckOutcomeProps) {
  const { matching, different, missing } = result;
  const time = at.toLocaleTimeString("en-GB", { hour: "2-digit", minute: "2-digit" });
  const report = `data:text/plain;charset=utf-8,${encodeURIComponent(writeReport(folder, result))}`;
  return (
    <div className="grid gap-8">
      <p>
        <span className={different.length > 0 ? "text-ember" : "text-text"}>{sayOutcome(result)}</span>{" "}
        Checked here, on your machine; nothing was sent back. <Figure>{spoken}</Figure>, {time}.
      </p>
      {different.length > 0 && (
        <Message kind="work">
          Do not use these files. Take them again; if they still do not match, tell the studio below that
          something is wrong.
          <Paths paths={different} />
        </Message>
      )}
      {missing.length > 0 && matching.length > 0 && (
        <details>
          <summary className="type-label cursor-pointer text-text">
            {missing.length} {missing.length === 1 ? "file was" : "files were"} not among those you chose
          </summary>
          <Paths paths={missing} />
        </details>
      )}
      <a href={report} download={`${folder}-check.txt`} className="action type-label justify-self-start">
        write the report as text
      </a>
    </div>
  );
}

function sayOutcome({ matching, different, missing }: CheckResult): string {
  if (different.length > 0)
    return `${different.length} ${different.length === 1 ? "file does" : "files do"} not match what was signed.`;
  if (matching.length === 0) return "None of this delivery’s files is among those you chose.";
  if (missing.length === 0) return `All ${matching.length} files match what was signed.`;
  return `${matching.length} files match what was signed, and ${missing.length} were not chosen.`;
}

function Paths({ paths }: { paths: string[] }) {
  return (
    <ul className="type-figure-small mt-8 break-all text-text">
      {paths.slice(0, named).map((path) => (
        <li key={path}>{path}</li>
      ))}
      {paths.length > named && <li>and {paths.length - named} more, in the report</li>}
    </ul>
  );
}
