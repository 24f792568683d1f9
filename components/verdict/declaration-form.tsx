"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useState } from "react";
import { useForm, useWatch } from "react-hook-form";
import { giveVerdictSchema, type ChosenKind } from "@/lib/reviews/schema";
import { meanings } from "@/lib/reviews/schema-declaration";
import type { DeclarationFacts } from "@/lib/reviews/schema-pages";
import { requestJson } from "../api/request";
import { showRefusal } from "../api/show-refusal";
import { Button } from "../button/button";
import { TextLink } from "../button/text-action";
import { Choice } from "../field/choice";
import { TextArea } from "../field/text-area";
import { TextField } from "../field/text-field";
import { Message } from "../message/message";
import { StandingGlyph } from "../standing/standing-glyph";
import { listNames } from "../words/number-words";
import { FrameInput } from "./frame-input";
import { Given } from "./given";

const kinds = ["signed off", "returned"] as const;
const labels: Record<ChosenKind, { words: string; act: string }> = {
  "signed off": {
    words: "In these words, which the client’s science note will carry",
    act: "Declare it signed off",
  },
  returned: { words: "For this reason, which the artist will read", act: "Declare it returned" },
};

/** The declaration to be completed and signed. Its sentences are those that are kept as the statement. */
export function DeclarationForm({ facts }: { facts: DeclarationFacts }) {
  const [statement, setStatement] = useState<string>();
  const { version, form, submit } = useDeclaration(facts, setStatement);
  const { register, control, formState } = form;
  const { errors, isSubmitting } = formState;
  const [kind, figures] = useWatch({ control, name: ["kind", "figures"] });
  if (statement) return <Given statement={statement} told={facts.told} version={version} />;

  const { words, act } = labels[kind ?? "signed off"];
  const matches = figures.trim().toLowerCase() === facts.digest?.slice(-8);
  return (
    <form method="post" onSubmit={submit} noValidate className="mt-24 max-w-720">
      <p className="type-declaration text-text">
        I, {facts.reader.name}, science advisor to {facts.production}, have looked at frames{" "}
        <FrameInput
          label="First frame"
          error={errors.first?.message}
          {...register("first", { valueAsNumber: true })}
        />{" "}
        to{" "}
        <FrameInput
          label="Last frame"
          error={errors.last?.message}
          {...register("last", { valueAsNumber: true })}
        />{" "}
        of version {facts.number} of <span className="whitespace-nowrap">{facts.shotCode}</span>, made by{" "}
        {facts.maker}, and at no other bytes than those of the digest{" "}
        <span className="max-lg:hidden">opposite</span>
        <span className="lg:hidden">beneath</span>.
      </p>
      <FrameErrors messages={[errors.first?.message, errors.last?.message]} />
      <Choice
        legend={
          <span className="type-declaration block pt-16 pb-8 text-text">On these frames I declare:</span>
        }
        size="declaration"
        options={kinds.map((value) => ({
          value,
          word: `${value}.`,
          meaning: meanings[value],
          glyph: <StandingGlyph standing={value} size={24} />,
        }))}
        error={errors.kind?.message}
        {...register("kind")}
      />
      <TextArea
        label={words}
        className="mt-24"
        rows={3}
        error={errors.words?.message}
        {...register("words")}
      />
      <div className="mt-24 flex flex-wrap items-start gap-x-16 gap-y-12">
        <TextField
          label="To sign, write the last eight figures of the digest"
          face="digest"
          autoComplete="off"
          spellCheck={false}
          maxLength={12}
          className="w-full sm:w-286"
          error={errors.figures?.message}
          hint={matches ? "They are the digest’s." : undefined}
          {...register("figures")}
        />
        <div className="flex flex-wrap items-center gap-16 sm:pt-22">
          <Button
            type="submit"
            look="primary"
            size="large"
            busy={isSubmitting}
            missing={kind ? undefined : "Choose signed off or returned first."}
          >
            {act}
          </Button>
          <TextLink href="/review" className="type-body">
            Keep for later
          </TextLink>
        </div>
      </div>
      {errors.root?.message && (
        <Message kind="work" className="mt-16">
          {errors.root.message}
        </Message>
      )}
      <p className="type-label mt-24 border-t border-hair pt-16 text-soft">
        {sayTold(facts.told)} The declaration joins the log and is never altered; a later one can only follow
        it.
      </p>
    </form>
  );
}

function useDeclaration(facts: DeclarationFacts, onGiven: (statement: string) => void) {
  const { id: version, first, last, after } = facts;
  const form = useForm({
    resolver: zodResolver(giveVerdictSchema),
    defaultValues: { version, first, last, words: "", figures: "", after },
  });
  const submit = form.handleSubmit(async (body) => {
    try {
      const given = await requestJson<{ statement: string }>(`/api/versions/${version}/verdicts`, { body });
      onGiven(given.statement);
    } catch (error) {
      showRefusal(error, form.setError, ["first", "last", "words", "figures", "kind"]);
    }
  });
  return { version, form, submit };
}

const FrameErrors = ({ messages }: { messages: (string | undefined)[] }) => (
  <p role="alert" className="type-small text-ember">
    {[...new Set(messages.filter(Boolean))].join(" ")}
  </p>
);

function sayTold(names: readonly string[]): string {
  return names.length === 0 ? "Nobody else is told." : `${listNames(names)} will be told.`;
}
