"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useRouter } from "next/navigation";
import { useState } from "react";
import { useForm } from "react-hook-form";
import { inviteInput } from "@/lib/people/schema";
import { requestJson } from "../api/request";
import { showRefusal } from "../api/show-refusal";
import { Button } from "../button/button";
import { Choice } from "../field/choice";
import { TextField } from "../field/text-field";
import { Message } from "../message/message";

const roleOptions = [
  { value: "artist", word: "artist.", meaning: "Sets up shots and renders them." },
  { value: "advisor", word: "science advisor.", meaning: "Signs off or returns." },
  { value: "producer", word: "producer.", meaning: "Plans, and delivers what is signed." },
  { value: "client", word: "client.", meaning: "Sees the deliveries published to them." },
] as const;

/** Asks someone by e-mail into a production. */
export function InviteForm({ productions }: { productions: { id: string; name: string }[] }) {
  const router = useRouter();
  const [sent, setSent] = useState<string>();
  const { register, handleSubmit, setError, reset, formState } = useForm({
    resolver: zodResolver(inviteInput),
    defaultValues: { productionId: productions[0]?.id ?? "", name: "", email: "", role: "artist" as const },
  });
  const { errors, isSubmitting } = formState;
  const submit = handleSubmit(async (body) => {
    setSent(undefined);
    try {
      await requestJson("/api/invitations", { body });
      setSent(`A letter with a link is on its way to ${body.email}. The link works once, for seven days.`);
      reset({ ...body, name: "", email: "" });
      router.refresh();
    } catch (error) {
      showRefusal(error, setError, ["productionId", "name", "email", "role"]);
    }
  });
  return (
    <section aria-labelledby="invite">
      <h2 id="invite" className="type-heading text-text">
        Invite someone
      </h2>
      <form method="post" onSubmit={submit} noValidate className="mt-12 grid gap-16">
        {productions.length > 1 && (
          <Choice
            legend="Into"
            options={productions.map(({ id, name }) => ({ value: id, word: name }))}
            error={errors.productionId?.message}
            {...register("productionId")}
          />
        )}
        <TextField label="Name" autoComplete="off" error={errors.name?.message} {...register("name")} />
        <TextField
          label="E-mail"
          type="email"
          autoComplete="off"
          error={errors.email?.message}
          {...register("email")}
        />
        <Choice legend="As" options={roleOptions} error={errors.role?.message} {...register("role")} />
        {errors.root?.message && <Message kind="work">{errors.root.message}</Message>}
        {sent && <Message kind="settled">{sent}</Message>}
        <div>
          <Button type="submit" look="primary" busy={isSubmitting}>
            Send the invitation
          </Button>
        </div>
      </form>
    </section>
  );
}
