"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useForm } from "react-hook-form";
import { resetPasswordInput } from "@/lib/people/schema";
import { requestJson } from "../api/request";
import { showRefusal } from "../api/show-refusal";
import { Button } from "../button/button";
import { TextField } from "../field/text-field";
import { Message } from "../message/message";
import { admit } from "./admit";

/** Sets a new password by an e-mailed link, and signs in with it. */
export function NewPasswordForm({ token, email }: { token: string; email: string }) {
  const { register, handleSubmit, setError, formState } = useForm({
    resolver: zodResolver(resetPasswordInput.pick({ password: true })),
    defaultValues: { password: "" },
  });
  const { errors, isSubmitting } = formState;
  const submit = handleSubmit(async ({ password }) => {
    try {
      await requestJson("/api/resets/password", { body: { token, password } });
      const why = await admit({ email, password }, "/");
      if (why) setError("root", { message: `Your new password is set, but you are not signed in. ${why}` });
    } catch (error) {
      showRefusal(error, setError, ["password"]);
    }
  });
  return (
    <form method="post" onSubmit={submit} noValidate className="grid gap-16">
      <input type="email" name="email" autoComplete="username" value={email} readOnly hidden />
      <TextField
        label="New password"
        type="password"
        autoComplete="new-password"
        autoFocus
        hint="At least 12 characters. Four unrelated words do well."
        error={errors.password?.message}
        {...register("password")}
      />
      {errors.root?.message && <Message kind="work">{errors.root.message}</Message>}
      <div className="mt-8">
        <Button type="submit" look="primary" busy={isSubmitting}>
          Set this password
        </Button>
      </div>
    </form>
  );
}
