"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useRouter } from "next/navigation";
import { useState } from "react";
import { useForm } from "react-hook-form";
import { createSequenceInput } from "@/lib/shots/schema";
import { requestJson } from "../api/request";
import { showRefusal } from "../api/show-refusal";
import { Button } from "../button/button";
import { TextAction } from "../button/text-action";
import { Dialog, DialogClose } from "../dialog/dialog";
import { TextField } from "../field/text-field";
import { Message } from "../message/message";

/** Adds a sequence after the last. */
export function NewSequence({ production }: { production: { id: string; name: string } }) {
  const router = useRouter();
  const [open, setOpen] = useState(false);
  const { register, handleSubmit, setError, reset, formState } = useForm({
    resolver: zodResolver(createSequenceInput),
    defaultValues: { production: production.id, name: "" },
  });
  const submit = handleSubmit(async (body) => {
    try {
      await requestJson("/api/sequences", { body });
      reset();
      setOpen(false);
      router.refresh();
    } catch (error) {
      showRefusal(error, setError, ["name"]);
    }
  });
  return (
    <Dialog
      trigger={<TextAction className="type-label">New sequence</TextAction>}
      open={open}
      onOpenChange={setOpen}
      title="New sequence"
      description={`It is added after the last sequence of ${production.name}.`}
    >
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
    </Dialog>
  );
}
