"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useForm } from "react-hook-form";
import { credentialsSchema } from "@/lib/people/schema";
import { Button } from "../button/button";
import { TextLink } from "../button/text-action";
import { TextField } from "../field/text-field";
import { Message } from "../message/message";
import { admit } from "./admit";

export interface SignInFormProps {
  /** Where to go afterwards; a path of ours. */
  next: string;
}

export function SignInForm({ next }: SignInFormProps) {
  const { register, handleSubmit, setError, formState } = useForm({
    resolver: zodResolver(credentialsSchema),
    defaultValues: { email: "", password: "" },
  });
  const { errors, isSubmitting, isSubmitSuccessful } = formState;
  const submit = handleSubmit(async (credentials) => {
    const why = await admit(credentials, next).catch(
      () => "The server could not be reached. Check the connection and try again.",
    );
    if (why) setError("root", { message: why });
  });
  return (
    // "post", so that a password can never end in an address, even before the script is there.
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
      <TextField
        label="Password"
        type="password"
        autoComplete="current-password"
        error={errors.password?.message}
        {...register("password")}
      />
      {errors.root?.message && <Message kind="work">{errors.root.message}</Message>}
      <div className="mt-8 flex flex-wrap items-center gap-16">
        <Button type="submit" look="primary" busy={isSubmitting || (isSubmitSuccessful && !errors.root)}>
          {isSubmitting ? "Signing in" : "Sign in"}
        </Button>
        <TextLink href="/reset" className="type-label">
          I forgot my password
        </TextLink>
      </div>
    </form>
  );
}
