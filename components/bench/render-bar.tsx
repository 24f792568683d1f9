"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import type { BenchPage } from "@/lib/setups/schema";
import { colourSpaceWords, qualityWords } from "@/lib/versions/schema";
import { setupSchema, type Setup } from "@/render/scene/setup";
import { requestJson } from "../api/request";
import { Button } from "../button/button";
import { Figure } from "../figure/figure";
import { ChoiceDialog } from "./choice-dialog";
import { chosenFrames, firstChoice } from "./render-choice";

export interface RenderBarProps {
  page: BenchPage;
  values: Setup;
  flush: () => Promise<number | undefined>;
}

/** The foot of the bench: what the next version would be, in a sentence, and the one act. */
export function RenderBar({ page, values, flush }: RenderBarProps) {
  const router = useRouter();
  const [choice, setChoice] = useState(firstChoice);
  const [busy, setBusy] = useState(false);
  const [refusal, setRefusal] = useState<string>();
  const { first, last } = chosenFrames(choice, values);
  const render = async () => {
    setBusy(true);
    setRefusal(undefined);
    try {
      const revision = await flush();
      if (revision === undefined) throw new Error("The setup is not saved, so nothing was rendered.");
      const { quality, colourSpace } = choice;
      const body = { revision, quality, colourSpace, first, last };
      const made = await requestJson<{ id: string }>(`/api/shots/${page.shot.id}/versions`, { body });
      router.push(`/versions/${made.id}`);
    } catch (error) {
      setRefusal((error as Error).message);
      setBusy(false);
    }
  };
  const number = (page.versions[0]?.number ?? 0) + 1;
  const count = last - first + 1;
  return (
    <section
      aria-label="Render a version"
      className="type-body sticky bottom-0 z-10 -mx-16 flex flex-wrap items-center justify-between gap-x-36 gap-y-8 border-t border-hair bg-ground px-16 py-12 text-soft sm:-mx-24 sm:px-24"
    >
      <p>
        Version {number}, {qualityWords[choice.quality]}, {first === last ? "frame" : "frames"}{" "}
        <Figure bright>{first === last ? first : `${first}–${last}`}</Figure> ({count}),{" "}
        {colourSpaceWords[choice.colourSpace]}.
        {refusal && (
          <span role="alert" className="block text-ember">
            {refusal}
          </span>
        )}
      </p>
      <div className="flex flex-wrap items-center gap-x-24 gap-y-8">
        <ChoiceDialog setup={values} choice={choice} onChoose={setChoice} />
        <Button
          look="primary"
          size="large"
          busy={busy}
          missing={whyNot(page, values)}
          onClick={() => void render()}
        >
          Render a version
        </Button>
      </div>
    </section>
  );
}

function whyNot({ shot }: BenchPage, values: Setup): string | undefined {
  if (shot.hold === "on hold") return "The shot is on hold; a producer can take it up again.";
  if (shot.hold === "omitted") return "The shot is omitted; a producer can take it up again.";
  return setupSchema.safeParse(values).success ? undefined : "A value cannot be. Its field says why.";
}
