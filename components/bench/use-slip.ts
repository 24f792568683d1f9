import { zodResolver } from "@hookform/resolvers/zod";
import { useEffect } from "react";
import { useForm, useWatch, type FieldErrors, type Path, type UseFormReturn } from "react-hook-form";
import { setupSchema, type Setup } from "@/render/scene/setup";
import { sayConsequences, type Consequences } from "./consequences";
import { readNumber } from "./read-number";

/** The setup as a form, checked at every change, with what follows from it. */
export interface Slip {
  form: UseFormReturn<Setup>;
  values: Setup;
  consequences: Consequences;
  readOnly: boolean;
  /** What a figure field is given: its value, and why it is refused. */
  figure: (path: Path<Setup>) => object;
  word: (path: Path<Setup>) => object;
}

export function useSlip(setup: Setup, readOnly: boolean): Slip {
  const form = useForm<Setup>({ defaultValues: setup, resolver: zodResolver(setupSchema), mode: "onChange" });
  const { control, register, trigger, formState } = form;
  const values = useWatch({ control }) as Setup;
  // One value can forbid another: all are checked whenever one changes.
  useEffect(() => {
    void trigger();
  }, [values, trigger]);
  const error = (path: Path<Setup>) => messageAt(formState.errors, path);
  return {
    form,
    values,
    consequences: sayConsequences(values),
    readOnly,
    figure: (path) => ({ ...register(path, { setValueAs: readNumber }), readOnly, error: error(path) }),
    word: (path) => ({ ...register(path), disabled: readOnly, error: error(path) }),
  };
}

/** The message of the fault at a dotted path. */
function messageAt(errors: FieldErrors<Setup>, path: string): string | undefined {
  let at: unknown = errors;
  for (const name of path.split(".")) at = (at as Record<string, unknown> | undefined)?.[name];
  return (at as { message?: string } | undefined)?.message;
}
