"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useRouter } from "next/navigation";
import { useForm, useWatch } from "react-hook-form";
import { defaultDays, publishDeliverySchema } from "@/lib/deliveries/schema";
import { requestJson } from "../api/request";
import { showRefusal } from "../api/show-refusal";
import { Button } from "../button/button";
import { CheckBox } from "../field/check-box";
import { Field } from "../field/field";
import { Message } from "../message/message";

export interface PublishFormProps {
  delivery: string;
  clients: { id: string; name: string }[];
  isStopped: boolean;
}

/** Whom the delivery is opened to, and for how long. */
export function PublishForm({ delivery, clients, isStopped }: PublishFormProps) {
  const router = useRouter();
  const { register, handleSubmit, setError, control, formState } = useForm({
    resolver: zodResolver(publishDeliverySchema),
    defaultValues: { delivery, recipients: clients.length === 1 ? [clients[0]!.id] : [], days: defaultDays },
  });
  const { errors, isSubmitting } = formState;
  const chosen = useWatch({ control, name: "recipients" }) ?? [];
  const submit = handleSubmit(async (body) => {
    try {
      await requestJson(`/api/deliveries/${delivery}/publication`, { body });
      router.refresh();
    } catch (error) {
      showRefusal(error, setError, ["recipients", "days"]);
    }
  });
  const missing = isStopped
    ? "A sign-off it rests on was withdrawn."
    : chosen.length === 0
      ? "Choose at least one recipient."
      : undefined;
  return (
    <form method="post" onSubmit={submit} noValidate className="grid gap-16 border-t border-text pt-16">
      <h2 className="type-heading text-text">Publish it</h2>
      {clients.length === 0 ? (
        <p className="type-label text-soft">This production has no client yet. Invite one in Studio.</p>
      ) : (
        <fieldset className="grid gap-8">
          <legend className="type-label mb-4 text-soft">To</legend>
          {clients.map(({ id, name }) => (
            <CheckBox key={id} label={name} value={id} {...register("recipients")} />
          ))}
          {errors.recipients?.message && <p className="type-small text-ember">{errors.recipients.message}</p>}
        </fieldset>
      )}
      <Field
        label="Open for"
        unit="days"
        inputMode="numeric"
        boxClassName="w-90"
        className="max-w-240"
        error={errors.days?.message}
        {...register("days", { valueAsNumber: true })}
      />
      {errors.root?.message && <Message kind="work">{errors.root.message}</Message>}
      <Button
        type="submit"
        look="primary"
        size="large"
        busy={isSubmitting}
        missing={missing}
        className="justify-self-start"
      >
        Publish it
      </Button>
      <p className="type-label text-soft">
        Each recipient is told by letter. From then on nothing in it changes; it can only be withdrawn.
      </p>
    </form>
  );
}
