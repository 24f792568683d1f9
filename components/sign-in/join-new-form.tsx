"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useEffect } from "react";
import { useForm } from "react-hook-form";
import { joinAsNewInput } from "@/lib/people/schema";
import { requestJson } from "../api/request";
import { showRefusal } from "../api/show-refusal";
import { Button } from "../button/button";
import { TextField } from "../field/text-field";
import { Message } from "../message/message";
import { admit } from "./admit";

const schema = joinAsNewInput.omit({ token: true });

export interface JoinNewFormProps {
  token: string;
  email: string;
  /** As the inviter wrote it. */
  name: string;
}

/** Makes an account for the invited address and signs in to it. */
export function JoinNewForm({ token, email, name }: JoinNewFormProps) {
  const { register, handleSubmit, setError, setValue, formState } = useForm({
    resolver: zodResolver(schema),
    defaultValues: { name, password: "", timeZone: "UTC" },
  });
  const { errors, isSubmitting } = formState;
  // Known only in the browser, so it is filled in once the page is there.
  useEffect(() => setValue("timeZone", Intl.DateTimeFormat().resolvedOptions().timeZone), [setValue]);
  const submit = handleSubmit(async (input) => {
    try {
      await requestJson("/api/invitations/acceptance", { body: { token, ...input } });
      const why = await admit({ email, password: input.password }, "/");
      if (why) setError("root", { message: `Your account is made, but you are not signed in. ${why}` });
    } catch (error) {
      showRefusal(error, setError, ["name", "password", "timeZone"]);
    }
  });
  return (
    <form method="post" onSubmit={submit} noValidate className="grid gap-16">
      <input type="email" name="email" autoComplete="username" value={email} readOnly hidden />
      <TextField
        label="Your name"
        autoComplete="name"
        hint="As it will stand in the log and in letters."
        error={errors.name?.message}
        {...register("name")}
      />
      <TextField
        label="Password"
        type="password"
        autoComplete="new-password"
        hint="At least 12 characters. Four unrelated words do well."
        error={errors.password?.message}
        {...register("password")}
      />
      <TextField
        label="Time zone"
        list="time-zones"
        spellCheck={false}
        hint="Dates and times are shown in it."
        error={errors.timeZone?.message}
        {...register("timeZone")}
      />
      <TimeZones />
      {errors.root?.message && <Message kind="work">{errors.root.message}</Message>}
      <div className="mt-8">
        <Button type="submit" look="primary" busy={isSubmitting}>
          Accept the invitation
        </Button>
      </div>
    </form>
  );
}

function TimeZones() {
  return (
    // The browser and the server may know different lists; what is offered is the browser's.
    <datalist id="time-zones" suppressHydrationWarning>
      {["UTC", ...Intl.supportedValuesOf("timeZone")].map((zone) => (
        <option key={zone} value={zone} suppressHydrationWarning />
      ))}
    </datalist>
  );
}
