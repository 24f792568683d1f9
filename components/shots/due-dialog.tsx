"use client";

import { useState, type FormEvent } from "react";
import type { ShotChange, ShotLine } from "@/lib/shots/schema";
import { Button } from "../button/button";
import { TextAction } from "../button/text-action";
import { Dialog, DialogClose } from "../dialog/dialog";
import { TextField } from "../field/text-field";

export interface DueDialogProps {
  shots: ShotLine[];
  onChange: (change: ShotChange) => Promise<void>;
}

/** Asks for the day the chosen shots are due. */
export function DueDialog({ shots, onChange }: DueDialogProps) {
  const [open, setOpen] = useState(false);
  const [refusal, setRefusal] = useState<string>();
  const [day, setDay] = useState(shots[0]?.dueOn ?? "");
  const save = async (dueOn: string | null) => {
    try {
      await onChange({ what: "due", dueOn });
      setOpen(false);
    } catch (error) {
      setRefusal((error as Error).message);
    }
  };
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (day === "") setRefusal("Choose a day, or take the due date away.");
    else void save(day);
  };
  return (
    <Dialog
      trigger={<TextAction>change the due date</TextAction>}
      open={open}
      onOpenChange={setOpen}
      title={
        shots.length === 1 ? `When is ${shots[0]?.code} due?` : `When are these ${shots.length} shots due?`
      }
    >
      <form onSubmit={submit} noValidate className="grid gap-16">
        <TextField
          label="Due"
          type="date"
          face="figures"
          value={day}
          onChange={(event) => setDay(event.target.value)}
          error={refusal}
          className="max-w-240"
        />
        <div className="flex flex-wrap items-center gap-16">
          <Button type="submit" look="primary">
            Set the date
          </Button>
          <TextAction onClick={() => void save(null)}>Take the due date away</TextAction>
          <DialogClose>
            <TextAction>Leave it</TextAction>
          </DialogClose>
        </div>
      </form>
    </Dialog>
  );
}
