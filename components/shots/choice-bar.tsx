"use client";

import { useRouter } from "next/navigation";
import { useState, type ReactNode } from "react";
import type { ShotChange, ShotLine, ShotList } from "@/lib/shots/schema";
import { TextAction } from "../button/text-action";
import { capitalised, countOf } from "../words/number-words";
import { ArtistDialog } from "./artist-dialog";
import { changeShots } from "./change-shots";
import { DueDialog } from "./due-dialog";

export interface ChoiceBarProps {
  chosen: ShotLine[];
  artists: ShotList["artists"];
  /** Called when the choice is given up, or acted on. */
  onDone: () => void;
}

/** The sentence at the foot of the page that acts on the chosen shots. */
export function ChoiceBar({ chosen, artists, onDone }: ChoiceBarProps) {
  const router = useRouter();
  const [refusal, setRefusal] = useState<string>();
  const [busy, setBusy] = useState(false);
  const act = async (change: ShotChange) => {
    setRefusal(undefined);
    await changeShots(
      chosen.map(({ id }) => id),
      change,
    );
    onDone();
    router.refresh();
  };
  const hold = async (hold: "none" | "on hold" | "omitted") => {
    if (busy) return;
    setBusy(true);
    await act({ what: "hold", hold }).catch((error: Error) => setRefusal(error.message));
    setBusy(false);
  };
  const resting = chosen.filter(({ standing }) => standing === "on hold" || standing === "omitted").length;
  const acts: ReactNode[] = [
    <DueDialog key="due" shots={chosen} onChange={act} />,
    <ArtistDialog key="artist" shots={chosen} artists={artists} onChange={act} />,
    resting < chosen.length && (
      <TextAction key="hold" onClick={() => void hold("on hold")}>
        put {it(chosen)} on hold
      </TextAction>
    ),
    resting < chosen.length && (
      <TextAction key="omit" onClick={() => void hold("omitted")}>
        mark {it(chosen)} omitted
      </TextAction>
    ),
    resting > 0 && (
      <TextAction key="release" onClick={() => void hold("none")}>
        take {it(chosen)} up again
      </TextAction>
    ),
    <TextAction key="let" onClick={onDone}>
      choose none
    </TextAction>,
  ].filter(Boolean);
  return (
    <section
      aria-label="What to do with the chosen shots"
      className="type-label sticky bottom-0 z-20 border-t border-text bg-ground px-16 py-8 text-text sm:px-48"
    >
      {refusal && (
        <p role="alert" className="mb-4 text-ember">
          {refusal}
        </p>
      )}
      <p className="flex flex-wrap gap-x-8 gap-y-4 leading-24">
        <span aria-live="polite">{sayChosen(chosen)}</span>
        {acts.map((one, index) => (
          <span key={index}>
            {one}
            {index < acts.length - 1 ? "," : "."}
          </span>
        ))}
      </p>
    </section>
  );
}

const it = (chosen: ShotLine[]) => (chosen.length === 1 ? "it" : "them");

function sayChosen(chosen: ShotLine[]): string {
  const codes = chosen.map(({ code }) => code);
  const named = codes.length > 4 ? `${codes.slice(0, 3).join(", ")} and others` : codes.join(", ");
  return `${capitalised(countOf(chosen.length, "shot", "shots"))} chosen, ${named}:`;
}
