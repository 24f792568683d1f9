"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { useRouter } from "next/navigation";
import { useForm } from "react-hook-form";
import { createShotInput, type ShotList } from "@/lib/shots/schema";
import { requestJson } from "../api/request";
import { showRefusal } from "../api/show-refusal";
import { Button } from "../button/button";
import { TextAction } from "../button/text-action";
import { DialogClose } from "../dialog/dialog";
import { SelectField } from "../field/select-field";
import { TextArea } from "../field/text-area";
import { TextField } from "../field/text-field";
import { Message } from "../message/message";

const orNull = (value: unknown) => (value === "" ? null : value);

/** What a new shot needs. */
export function NewShotForm({ list, onDone }: { list: ShotList; onDone: () => void }) {
  const router = useRouter();
  const { register, handleSubmit, setError, formState } = useForm({
    resolver: zodResolver(createShotInput),
    defaultValues: {
      production: list.production.id,
      sequence: list.sequences.at(-1)?.id ?? "",
      code: `${list.production.code}-`,
      brief: "",
      dueOn: null,
      artist: null,
    },
  });
  const { errors, isSubmitting } = formState;
  const submit = handleSubmit(async (body) => {
    try {
      await requestJson("/api/shots", { body });
      onDone();
      router.refresh();
    } catch (error) {
      showRefusal(error, setError, ["code", "brief", "dueOn", "sequence", "artist"]);
    }
  });
  return (
    <form onSubmit={(event) => void submit(event)} noValidate className="grid gap-16">
      <TextField
        label="Code"
        face="figures"
        autoComplete="off"
        spellCheck={false}
        error={errors.code?.message}
        hint={`As ${list.production.code}-010. It stands in every file's name.`}
        {...register("code")}
      />
      <TextArea
        label="Brief"
        rows={2}
        error={errors.brief?.message}
        hint="What is seen, in a sentence."
        {...register("brief")}
      />
      <SelectField
        label="Sequence"
        error={errors.sequence?.message}
        boxClassName="max-w-300"
        {...register("sequence")}
      >
        {list.sequences.map(({ id, number, name }) => (
          <option key={id} value={id}>
            {number}, {name}
          </option>
        ))}
      </SelectField>
      <SelectField
        label="Artist"
        error={errors.artist?.message}
        boxClassName="max-w-300"
        {...register("artist", { setValueAs: orNull })}
      >
        <option value="">nobody for now</option>
        {list.artists.map(({ id, name }) => (
          <option key={id} value={id}>
            {name}
          </option>
        ))}
      </SelectField>
      <TextField
        label="Due"
        type="date"
        face="figures"
        className="max-w-240"
        error={errors.dueOn?.message}
        hint="Can be left open."
        {...register("dueOn", { setValueAs: orNull })}
      />
      {errors.root?.message && <Message kind="work">{errors.root.message}</Message>}
      <div className="flex items-center gap-16">
        <Button type="submit" look="primary" busy={isSubmitting}>
          Add the shot
        </Button>
        <DialogClose>
          <TextAction>Leave it</TextAction>
        </DialogClose>
      </div>
    </form>
  );
}
