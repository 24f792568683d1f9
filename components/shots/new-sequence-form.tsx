"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useRouter } from "next/navigation";
import { useForm } from "react-hook-form";
import { createSequenceInput } from "@/lib/shots/schema";
import { requestJson } from "../api/request";
import { showRefusal } from "../api/show-refusal";
import { Button } from "../button/button";
import { TextAction } from "../button/text-action";
import { DialogClose } from "../dialog/dialog";
import { TextField } from "../field/text-field";
import { Message } from "../message/message";

/** What a new sequence needs. */
export function NewSequenceForm({ production, onDone }: { production: string; onDone: () => void }) {
  const router = useRouter();
  const { register, handleSubmit, setError, formState } = useForm({
    resolver: zodResolver(createSequenceInput),
    defaultValues: { production, name: "" },
  });
  const submit = handleSubmit(async (body) => {
    try {
      await requestJson("/api/sequences", { body });
      onDone();
      router.refresh();
    } catch (error) {
      showRefusal(error, setError, ["name"]);
    }
  });
  return (
    <form onSubmit={(event) => void submit(event)} noValidate className="grid gap-16">
      <TextField
        label="Name"
        autoComplete="off"
        error={formState.errors.name?.message}
        {...register("name")}
      />
      {formState.errors.root?.message && <Message kind="work">{formState.errors.root.message}</Message>}
      <div className="flex items-center gap-16">
        <Button type="submit" look="primary" busy={formState.isSubmitting}>
          Add it
        </Button>
        <DialogClose>
          <TextAction>Leave it</TextAction>
        </DialogClose>
      </div>
    </form>
  );
}
