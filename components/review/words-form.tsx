"use client";

import { useState, type FormEvent, type ReactNode } from "react";
import { Button } from "../button/button";
import { TextAction } from "../button/text-action";
import { DialogClose } from "../dialog/dialog";
import { TextArea } from "../field/text-area";
import { Message } from "../message/message";

export interface WordsFormProps {
  label: string;
  hint?: ReactNode;
  act: string;
  /** What is said when no words are given. */
  needed: string;
  onSubmit: (words: string) => Promise<void>;
}

/** One decision that needs words: the words, the act, and the way out without it. */
export function WordsForm({ label, hint, act, needed, onSubmit }: WordsFormProps) {
  const [words, setWords] = useState("");
  const [fault, setFault] = useState<{ field?: string; root?: string }>({});
  const [busy, setBusy] = useState(false);
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    if (words.trim() === "") return setFault({ field: needed });
    setBusy(true);
    try {
      await onSubmit(words.trim());
    } catch (error) {
      setFault({ root: error instanceof Error ? error.message : "Something failed here. Try again." });
      setBusy(false);
    }
  };
  return (
    <form onSubmit={submit} noValidate className="grid gap-16">
      <TextArea
        label={label}
        hint={hint}
        rows={4}
        value={words}
        error={fault.field}
        onChange={(event) => {
          setWords(event.target.value);
          setFault({});
        }}
      />
      {fault.root && <Message kind="work">{fault.root}</Message>}
      <div className="flex flex-wrap items-center gap-16">
        <Button type="submit" look="primary" busy={busy}>
          {act}
        </Button>
        <DialogClose>
          <TextAction>Leave it as it is</TextAction>
        </DialogClose>
      </div>
    </form>
  );
}
