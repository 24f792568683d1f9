"use client";

import type { ChangeEvent } from "react";
import { figureIn, sayBytes, unitFor } from "@/lib/deliveries/schema-bytes";
import { TextAction } from "../button/text-action";
import { Figure } from "../figure/figure";
import { Message } from "../message/message";
import { ProgressRuler } from "../ruler/progress-ruler";
import { CheckOutcome } from "./check-outcome";
import { useCheck } from "./use-check";

export interface CheckArrivedProps {
  delivery: string;
  bytes: number;
  /** The package's name, for the report. */
  folder: string;
}

/** Hashing what arrived, here in the browser: nothing is sent back. */
export function CheckArrived({ delivery, bytes, folder }: CheckArrivedProps) {
  const { check, begin, cancel } = useCheck(delivery);
  const unit = unitFor(bytes);
  const total = check.state === "checking" || check.state === "done" ? check.total : bytes;
  const done = check.state === "checking" ? check.done : check.state === "done" ? check.result.bytes : 0;
  const spoken = `${figureIn(done, unit.size)} of ${figureIn(total, unit.size)} ${unit.name}`;
  return (
    <section aria-labelledby="check" className="min-w-0 border-t border-hair pt-16 sm:border-0 sm:pt-0">
      <h2 id="check" className="type-heading text-text">
        Check what arrived
      </h2>
      <div className="type-body mt-4 text-soft" aria-live="polite">
        {check.state === "waiting" && (
          <p>
            Choose the archive, or the folder you unpacked. It is checked here, on your machine; nothing is
            sent back.
          </p>
        )}
        {check.state === "reading" && <p>Reading the list of files…</p>}
        {check.state === "checking" && (
          <p>
            Checking: <Figure>{spoken}</Figure>. <TextAction onClick={cancel}>Stop</TextAction>
          </p>
        )}
        {check.state === "failed" && <Message kind="work">{check.why}</Message>}
        {check.state === "done" && <CheckOutcome {...check} folder={folder} spoken={spoken} />}
      </div>
      {(check.state === "checking" || check.state === "done") && (
        <ProgressRuler
          label={`${unit.name} checked`}
          value={done / unit.size}
          max={total / unit.size}
          spoken={spoken}
          tone={check.state === "done" && check.result.different.length > 0 ? "text" : "ice"}
          className="-mt-12"
        />
      )}
      {check.state !== "checking" && check.state !== "reading" && (
        <div className="mt-12 flex flex-wrap items-center gap-x-24 gap-y-8">
          <FileChoice
            label={check.state === "done" ? "Check another archive" : "Choose the archive"}
            accept=".zip,application/zip"
            onChoose={begin}
          />
          <FileChoice label="Choose the folder" isFolder onChoose={begin} />
          <span className="type-label text-soft">{sayBytes(bytes)} in all</span>
        </div>
      )}
    </section>
  );
}

interface FileChoiceProps {
  label: string;
  accept?: string;
  isFolder?: boolean;
  onChoose: (files: readonly File[]) => Promise<void>;
}

/** The browser's own way to choose files, under a word of ours. */
function FileChoice({ label, accept, isFolder, onChoose }: FileChoiceProps) {
  const choose = (event: ChangeEvent<HTMLInputElement>) => {
    const files = [...(event.target.files ?? [])];
    event.target.value = "";
    if (files.length > 0) void onChoose(files);
  };
  return (
    <label
      className={`action type-label cursor-pointer has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-bright ${isFolder ? "max-sm:hidden" : ""}`}
    >
      {label}
      <input
        type="file"
        className="sr-only"
        accept={accept}
        onChange={choose}
        {...(isFolder && { webkitdirectory: "" })}
      />
    </label>
  );
}
