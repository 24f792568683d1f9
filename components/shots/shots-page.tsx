"use client";

import { NuqsAdapter } from "nuqs/adapters/next/app";
import { useMemo, useState } from "react";
import type { ShotList } from "@/lib/shots/schema";
import { Empty } from "../empty/empty";
import { useChanges } from "../live/use-changes";
import { ChoiceBar } from "./choice-bar";
import { chooseDates } from "./date-range";
import { FilterSentence } from "./filter-sentence";
import { NewSequence } from "./new-sequence";
import { NewShot } from "./new-shot";
import { sayShots } from "./say";
import { ShotCards } from "./shot-cards";
import { ShotTable } from "./shot-table";

/** What stands where, what is late, and the acts that change it. */
export function ShotsPage({ list }: { list: ShotList }) {
  const [marked, mark] = useState<ReadonlySet<string>>(new Set());
  useChanges(({ productionId, kind }) => productionId === list.production.id && kind !== "frame.progress");

  const lines = useMemo(() => list.groups.flatMap(({ shots }) => shots), [list]);
  const dates = { ...chooseDates(lines, list.today), today: list.today };
  // Only what is shown can be acted on: a shot that a filter hides is no longer chosen.
  const chosen = lines.filter(({ id }) => marked.has(id));
  const choose = (id: string, on: boolean) => {
    const next = new Set(marked);
    if (on) next.add(id);
    else next.delete(id);
    mark(next);
  };
  const shown = {
    list,
    dates,
    chosen: new Set(chosen.map(({ id }) => id)),
    onChoose: list.mayChange ? choose : undefined,
  };
  return (
    <NuqsAdapter>
      <div className="flex min-h-[calc(100dvh-40px)] flex-col">
        <div className="mx-auto w-full max-w-1920 flex-1 px-16 pt-24 pb-24 sm:px-48">
          <div className="flex flex-wrap items-start justify-between gap-x-24 gap-y-12">
            <h1 className="type-heading text-text sm:text-[2rem] sm:leading-40">{sayShots(list.totals)}</h1>
            {list.mayChange && (
              <div className="flex items-center gap-16">
                <NewSequence production={list.production} />
                {list.sequences.length > 0 && <NewShot key={list.sequences.length} list={list} />}
              </div>
            )}
          </div>
          <div className="mt-8">
            <FilterSentence list={list} />
          </div>
          {lines.length === 0 ? (
            <Empty
              title={list.totals.shots === 0 ? "There is no shot here yet." : "No shot is like that."}
              className="mt-36"
            >
              {sayEmpty(list)}
            </Empty>
          ) : (
            <>
              <div className="mt-24 hidden lg:block">
                <ShotTable {...shown} />
              </div>
              <div className="lg:hidden">
                <ShotCards {...shown} />
              </div>
            </>
          )}
        </div>
        {chosen.length > 0 && (
          <ChoiceBar
            key={[...shown.chosen].join()}
            chosen={chosen}
            artists={list.artists}
            onDone={() => mark(new Set())}
          />
        )}
      </div>
    </NuqsAdapter>
  );
}

function sayEmpty({ totals, sequences, mayChange }: ShotList): string {
  if (totals.shots > 0) return "Change a word of the sentence above to see the others.";
  if (!mayChange) return "A producer adds sequences and shots.";
  return sequences.length === 0 ? "Begin with a sequence, then add its shots." : "Add the first one.";
}
