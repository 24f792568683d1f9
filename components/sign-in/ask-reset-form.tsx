"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useState } from "react";
import { useForm } from "react-hook-form";
import { askForResetInput } from "@/lib/people/schema";
import { requestJson } from "../api/request";
import { showRefusal } from "../api/show-refusal";
import { Button } from "../button/button";
import { TextLink } from "../button/text-action";
import { TextField } from "../field/text-field";
import { Message } from "../message/message";

/** Asks for a letter with a reset link. The answer is the same whether or not the address has an account. */
export function AskResetForm() {
  const [answer, setAnswer] = useState<string>();
  const { register, handleSubmit, setError, formState } = useForm({
    resolver: zodResolver(askForResetInput),
    defaultValues: { email: "" },
  });
  const { errors, isSubmitting } = formState;
  const submit = handleSubmit(async (body) => {
    setAnswer(undefined);
    try {
      setAnswer((await requestJson<{ words: string }>("/api/resets", { body })).words);
    } catch (error) {
      showRefusal(error, setError, ["email"]);
    }
  });
  return (
    <form method="post" onSubmit={submit} noValidate className="grid gap-16">
      <TextField
        label="E-mail"
        type="email"
        autoComplete="username"
        inputMode="email"
        autoFocus
        error={errors.email?.message}
        {...register("email")}
      />
      {errors.root?.message && <Message kind="work">{errors.root.message}</Message>}
      {answer && <Message kind="settled">{answer}</Message>}
      <div className="mt-8 flex flex-wrap items-center gap-16">
        <Button type="submit" look="primary" busy={isSubmitting}>
          Send me a link
        </Button>
        <TextLink href="/sign-in" className="type-label">
          Back to sign in
        </TextLink>
      </div>
    </form>
  );
}
