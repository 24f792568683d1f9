"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { useForm } from "react-hook-form";
import { requestJson } from "../api/request";
import { showRefusal } from "../api/show-refusal";
import { Button } from "../button/button";
import { TextLink } from "../button/text-action";
import { TextField } from "../field/text-field";
import { Message } from "../message/message";
import { admit } from "./admit";

export interface JoinKnownFormProps {
  token: string;
  email: string;
  /** The reader is signed in to this very account, so no password is asked. */
  signedIn: boolean;
}

/** Joins one more production with an account that exists. */
export function JoinKnownForm({ token, email, signedIn }: JoinKnownFormProps) {
  const { register, handleSubmit, setError, formState } = useForm({ defaultValues: { password: "" } });
  const router = useRouter();
  const [joined, setJoined] = useState(false);
  const { errors, isSubmitting } = formState;
  const submit = handleSubmit(async ({ password }) => {
    try {
      if (!joined) {
        const body = signedIn ? { token } : { token, password };
        await requestJson("/api/invitations/acceptance", { method: "PUT", body });
        setJoined(true);
      }
      if (signedIn) return router.push("/");
      const why = await admit({ email, password }, "/");
      if (why) setError("root", { message: why });
    } catch (error) {
      showRefusal(error, setError, ["password"]);
    }
  });
  return (
    <form method="post" onSubmit={submit} noValidate className="grid gap-16">
      <input type="email" name="email" autoComplete="username" value={email} readOnly hidden />
      {!signedIn && (
        <TextField
          label="Password"
          type="password"
          autoComplete="current-password"
          autoFocus
          error={errors.password?.message}
          {...register("password")}
        />
      )}
      {errors.root?.message && <Message kind="work">{errors.root.message}</Message>}
      <div className="mt-8 flex flex-wrap items-center gap-16">
        <Button type="submit" look="primary" busy={isSubmitting}>
          Accept the invitation
        </Button>
        {!signedIn && (
          <TextLink href="/reset" className="type-label">
            I forgot my password
          </TextLink>
        )}
      </div>
    </form>
  );
}
