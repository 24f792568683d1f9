"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useRouter } from "next/navigation";
import { useForm, useWatch } from "react-hook-form";
import { makeDeliverySchema } from "@/lib/deliveries/schema";
import type { SignedRuns } from "@/lib/deliveries/schema-pages";
import { requestJson } from "../api/request";
import { showRefusal } from "../api/show-refusal";
import { Button } from "../button/button";
import { CheckBox } from "../field/check-box";
import { Choice } from "../field/choice";
import { SelectField } from "../field/select-field";
import { TextArea } from "../field/text-area";
import { TextField } from "../field/text-field";
import { Message } from "../message/message";
import { RunTable } from "./run-table";
import { SizeSentence } from "./size-sentence";

const fields = ["title", "words", "items", "formats", "layout", "separator", "digits"] as const;

/** The choices of a delivery. The foot says its size as a sentence, then stands the one act. */
export function AssembleForm({ signed }: { signed: SignedRuns }) {
  const { form, submit } = useAssembly(signed);
  const { register, control, formState, setValue } = form;
  const { errors, isSubmitting } = formState;
  const chosen = useWatch({ control });
  const items = chosen.items ?? [];
  return (
    <form method="post" onSubmit={submit} noValidate className="mt-24">
      <div className="grid gap-x-72 gap-y-36 lg:grid-cols-[minmax(0,1fr)_360px]">
        <div className="min-w-0">
          <RunTable
            runs={signed.runs}
            chosen={items.map(({ verdict, first }) => `${verdict} ${first}`)}
            onChange={(next) => setValue("items", next, { shouldValidate: formState.isSubmitted })}
          />
          {errors.items?.message && <p className="type-small mt-8 text-ember">{errors.items.message}</p>}
          {errors.items?.root?.message && (
            <p className="type-small mt-8 text-ember">{errors.items.root.message}</p>
          )}
          <TextField
            label="Title"
            className="mt-36 max-w-560"
            error={errors.title?.message}
            {...register("title")}
          />
          <TextArea
            label="Words to the client, if any"
            rows={3}
            className="mt-16 max-w-560"
            error={errors.words?.message}
            {...register("words")}
          />
        </div>
        <div className="grid content-start gap-24">
          <fieldset className="grid gap-8">
            <legend className="type-label mb-4 text-soft">Files</legend>
            <CheckBox label="PNG, 16-bit sRGB" value="png" {...register("formats")} />
            <CheckBox label="OpenEXR, half-float, scene-linear" value="exr" {...register("formats")} />
            {errors.formats?.message && <p className="type-small text-ember">{errors.formats.message}</p>}
          </fieldset>
          <Choice
            legend="Folders"
            options={[
              { value: "by shot", word: "By shot,", meaning: "then by format." },
              { value: "by format", word: "By format,", meaning: "then by shot." },
            ]}
            {...register("layout")}
          />
          <Choice
            legend="Before the frame’s number"
            options={[
              {
                value: ".",
                word: "A dot,",
                meaning: "as film names have it.",
              },
              { value: "_", word: "An underscore,", meaning: "as dome names have it." },
            ]}
            {...register("separator")}
          />
          <SelectField
            label="Figures in a frame’s number"
            boxClassName="w-66"
            error={errors.digits?.message}
            {...register("digits", { valueAsNumber: true })}
          >
            {[4, 5, 6].map((digits) => (
              <option key={digits}>{digits}</option>
            ))}
          </SelectField>
        </div>
      </div>
      <div className="mt-36 border-t border-text pt-16">
        <SizeSentence choice={chosen} />
        {errors.root?.message && (
          <Message kind="work" className="mt-12 max-w-640">
            {errors.root.message}
          </Message>
        )}
        <div className="mt-16 flex flex-wrap items-center gap-16">
          <Button
            type="submit"
            look="primary"
            size="large"
            busy={isSubmitting}
            missing={items.length === 0 ? "Choose at least one signed-off version." : undefined}
          >
            Assemble it
          </Button>
          <span className="type-label text-soft">
            Nobody outside the studio sees it until it is published.
          </span>
        </div>
      </div>
    </form>
  );
}

function useAssembly({ production }: SignedRuns) {
  const router = useRouter();
  const isDome = production.kind === "dome";
  const form = useForm({
    resolver: zodResolver(makeDeliverySchema),
    defaultValues: {
      production: production.id,
      ...{
        title: "",
        words: "",
        items: [] as { version: string; verdict: string; first: number; last: number }[],
      },
      ...{ formats: ["png", "exr"] as ("png" | "exr")[], layout: "by shot" as const },
      ...{ separator: isDome ? ("_" as const) : ("." as const), digits: isDome ? 5 : 4 },
    },
  });
  const submit = form.handleSubmit(async (body) => {
    try {
      const { delivery } = await requestJson<{ delivery: string }>("/api/deliveries", { body });
      router.push(`/deliveries/${delivery}`);
    } catch (error) {
      showRefusal(error, form.setError, fields);
    }
  });
  return { form, submit };
}
