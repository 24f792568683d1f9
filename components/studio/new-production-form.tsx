"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useRouter } from "next/navigation";
import { useState } from "react";
import { useForm } from "react-hook-form";
import { createProductionInput } from "@/lib/productions/schema";
import { requestJson } from "../api/request";
import { showRefusal } from "../api/show-refusal";
import { Button } from "../button/button";
import { Choice } from "../field/choice";
import { TextField } from "../field/text-field";
import { Message } from "../message/message";

const kindOptions = [
  { value: "film", word: "film.", meaning: "Seen on a flat screen." },
  { value: "dome", word: "dome.", meaning: "Seen all around, in a planetarium." },
] as const;

/** Begins a production; for the studio's owner. */
export function NewProductionForm() {
  const router = useRouter();
  const [begun, setBegun] = useState<string>();
  const { register, handleSubmit, setError, reset, formState } = useForm({
    resolver: zodResolver(createProductionInput),
    defaultValues: { name: "", code: "", kind: "film" as const },
  });
  const { errors, isSubmitting } = formState;
  const submit = handleSubmit(async (body) => {
    setBegun(undefined);
    try {
      await requestJson("/api/productions", { body });
      setBegun(`${body.name} is begun. Invite its producer next.`);
      reset();
      router.refresh();
    } catch (error) {
      showRefusal(error, setError, ["name", "code", "kind"]);
    }
  });
  return (
    <section aria-labelledby="begin">
      <h2 id="begin" className="type-heading text-text">
        Begin a production
      </h2>
      <form method="post" onSubmit={submit} noValidate className="mt-12 grid gap-16">
        <TextField label="Title" autoComplete="off" error={errors.name?.message} {...register("name")} />
        <TextField
          label="Code"
          face="figures"
          autoComplete="off"
          spellCheck={false}
          hint="Begins its shots' codes and its files' names, as LH in LH-020. It cannot be changed later."
          error={errors.code?.message}
          {...register("code")}
        />
        <Choice legend="Kind" options={kindOptions} error={errors.kind?.message} {...register("kind")} />
        {errors.root?.message && <Message kind="work">{errors.root.message}</Message>}
        {begun && <Message kind="settled">{begun}</Message>}
        <div>
          <Button type="submit" busy={isSubmitting}>
            Begin it
          </Button>
        </div>
      </form>
    </section>
  );
}
