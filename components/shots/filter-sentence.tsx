"use client";

import { parseAsString, parseAsStringLiteral, useQueryStates } from "nuqs";
import { useTransition } from "react";
import type { ShotList } from "@/lib/shots/schema";
import { shotOrders, standings } from "@/lib/shots/schema-standing";
import { Figure } from "../figure/figure";
import { sayDuration } from "./say";
import { WordChoice } from "./word-choice";

const all = "all";

const keys = {
  production: parseAsString,
  standing: parseAsStringLiteral(standings),
  holder: parseAsString,
  order: parseAsStringLiteral(shotOrders).withDefault("sequence"),
};

export interface FilterSentenceProps {
  list: ShotList;
}

/** The filter, said in a sentence whose words can be changed; what is chosen is in the address. */
export function FilterSentence({ list }: FilterSentenceProps) {
  const [pending, startTransition] = useTransition();
  const [chosen, choose] = useQueryStates(keys, { shallow: false, history: "push", startTransition });
  const orNull = (value: string) => (value === all ? null : value);
  return (
    <p className="type-body text-soft" aria-busy={pending || undefined}>
      Shown:{" "}
      <WordChoice
        label="which shots"
        value={chosen.standing ?? all}
        options={[
          { value: all, word: "every shot" },
          ...standings.map((standing) => ({ value: standing, word: `shots ${standing}` })),
        ]}
        onChoose={(value) => void choose({ standing: standings.find((one) => one === value) ?? null })}
      />
      {list.productions.length > 1 && (
        <>
          {" of "}
          <WordChoice
            label="production"
            value={list.production.id}
            options={list.productions.map(({ id, name }) => ({ value: id, word: name }))}
            onChoose={(production) => void choose({ production, standing: null, holder: null })}
          />
        </>
      )}
      {", held by "}
      <WordChoice
        label="who has them"
        value={chosen.holder ?? all}
        options={[
          { value: all, word: "anyone" },
          ...list.holders.map(({ id, name }) => ({ value: id, word: name })),
          { value: "queue", word: "the render queue" },
          { value: "nobody", word: "nobody" },
        ]}
        onChoose={(value) => void choose({ holder: orNull(value) })}
      />
      {", in order of "}
      <WordChoice
        label="order"
        value={chosen.order}
        options={shotOrders.map((order) => ({ value: order, word: order }))}
        onChoose={(value) => void choose({ order: shotOrders.find((one) => one === value) ?? null })}
      />
      {". Machine time so far "}
      <Figure bright>{sayDuration(list.totals.milliseconds)}</Figure>.
    </p>
  );
}
