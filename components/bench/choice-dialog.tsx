"use client";

import { useState, type FormEvent } from "react";
import type { Setup } from "@/render/scene/setup";
import { Button } from "../button/button";
import { TextAction } from "../button/text-action";
import { Dialog } from "../dialog/dialog";
import { Choice } from "../field/choice";
import { Field } from "../field/field";
import { readNumber } from "./read-number";
import { chosenFrames, type RenderChoice } from "./render-choice";

const qualityOptions = [
  { value: "proof", word: "Proof.", meaning: "One light path a pixel: quick, for judging." },
  {
    value: "master",
    word: "Master.",
    meaning: "Four light paths a pixel: smooth edges, for delivery; four times the work.",
  },
] as const;

const spaceOptions = [
  { value: "rec709", word: "Linear Rec.709.", meaning: "For television, the web and most planetariums." },
  { value: "acescg", word: "ACEScg.", meaning: "For compositing in an ACES pipeline." },
] as const;

export interface ChoiceDialogProps {
  setup: Setup;
  choice: RenderChoice;
  onChoose: (choice: RenderChoice) => void;
}

/** Asks for quality, colour space and frames of the next version. */
export function ChoiceDialog({ setup, choice, onChoose }: ChoiceDialogProps) {
  const [open, setOpen] = useState(false);
  return (
    <Dialog
      trigger={<TextAction>quality and frames</TextAction>}
      open={open}
      onOpenChange={setOpen}
      title="Quality and frames"
      description="They are frozen with the version, as the setup is."
    >
      <ChoiceForm
        {...{ setup, choice }}
        onChoose={(next) => {
          onChoose(next);
          setOpen(false);
        }}
      />
    </Dialog>
  );
}

function ChoiceForm({ setup, choice, onChoose }: ChoiceDialogProps) {
  const { first: from, last: to } = setup.time;
  const [quality, setQuality] = useState(choice.quality);
  const [colourSpace, setColourSpace] = useState(choice.colourSpace);
  const given = chosenFrames(choice, setup);
  const [run, setRun] = useState(given);
  const faults = {
    first: faultOf(run.first, from, Math.min(to, run.last || to)),
    last: faultOf(run.last, Math.max(from, run.first || from), to),
  };
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (faults.first || faults.last) return;
    onChoose({ quality, colourSpace, frames: run.first === from && run.last === to ? "all" : run });
  };
  return (
    <form onSubmit={submit} noValidate className="grid gap-20">
      <Choice
        legend="Quality"
        options={qualityOptions}
        value={quality}
        onChange={(event) => setQuality(event.target.value === "master" ? "master" : "proof")}
      />
      <Choice
        legend="Colour space of the OpenEXR files"
        options={spaceOptions}
        value={colourSpace}
        onChange={(event) => setColourSpace(event.target.value === "acescg" ? "acescg" : "rec709")}
      />
      <div className="grid grid-cols-2 gap-24">
        {(["first", "last"] as const).map((end) => (
          <Field
            key={end}
            label={`${end} frame`}
            inputMode="numeric"
            defaultValue={given[end]}
            onChange={(event) => setRun({ ...run, [end]: readNumber(event.target.value) })}
            error={faults[end]}
            consequence={end === "first" ? `the setup begins at ${from}` : `the setup ends at ${to}`}
          />
        ))}
      </div>
      <div>
        <Button type="submit" look="primary">
          Choose these
        </Button>
      </div>
    </form>
  );
}

function faultOf(value: number, low: number, high: number): string | undefined {
  if (Number.isInteger(value) && value >= low && value <= high) return undefined;
  return `A whole frame number between ${low} and ${high}.`;
}
