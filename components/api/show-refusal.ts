import type { FieldValues, Path, UseFormSetError } from "react-hook-form";
import { RequestError } from "./request";

/** Puts the server's refusal beside the field it names, or above the form's act when it names none of these. */
export function showRefusal<T extends FieldValues>(
  error: unknown,
  setError: UseFormSetError<T>,
  fields: readonly Path<T>[],
): void {
  const message = error instanceof Error ? error.message : "Something failed here. Try again.";
  const field = error instanceof RequestError ? fields.find((name) => name === error.field) : undefined;
  if (!field) return setError("root", { message });
  // The server names the field before the words; here the words stand beside it.
  setError(field, { message: message.replace(`${field}: `, "") }, { shouldFocus: true });
}
