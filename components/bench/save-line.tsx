"use client";

import { useState } from "react";
import type { BenchPage } from "@/lib/setups/schema";
import { TextAction } from "../button/text-action";
import { Message } from "../message/message";
import type { SaveState } from "./save-setup";

/** "Saved 10:42", or why not. */
export function SaveLine({ page, state }: { page: BenchPage; state: SaveState }) {
  if (!page.may.save)
    return <p className="type-label text-soft">Only an artist of this production changes the setup.</p>;
  return (
    <p role="status" className={`type-label ${state.kind === "failed" ? "text-ember" : "text-soft"}`}>
      {sayState(state, page.reader.timeZone)}
    </p>
  );
}

function sayState(state: SaveState, timeZone: string): string {
  if (state.kind === "waiting" || state.kind === "saving") return "Saving …";
  if (state.kind === "unfit") return "Not saved: a value cannot be. Its field says why.";
  if (state.kind === "failed") return `Not saved: ${state.message}`;
  if (state.kind === "conflict") return "Not saved.";
  const at = new Date(state.at).toLocaleTimeString("en-GB", { timeZone, hour: "2-digit", minute: "2-digit" });
  return `Saved ${at}${state.by ? ` by ${state.by}` : ""}`;
}

export interface ConflictProps {
  message: string;
  onKeep: () => Promise<void>;
  onTakeTheirs: () => Promise<void>;
}

/** Someone saved first: the reader chooses whose values stay. */
export function Conflict({ message, onKeep, onTakeTheirs }: ConflictProps) {
  const [refusal, setRefusal] = useState<string>();
  const attempt = (act: () => Promise<void>) => () =>
    void act().catch((error: Error) => setRefusal(error.message));
  return (
    <Message kind="work" className="mb-24">
      {message} Your values are still in the fields.{" "}
      <TextAction onClick={attempt(onTakeTheirs)}>Show the saved values instead</TextAction>, or{" "}
      <TextAction onClick={attempt(onKeep)}>save mine over them</TextAction>.
      {refusal && <span className="block text-ember">{refusal}</span>}
    </Message>
  );
}
