import type { ComponentProps } from "react";

export interface FrameInputProps extends ComponentProps<"input"> {
  label: string;
  error?: string | undefined;
}

/** A frame's number, written within a sentence. */
export function FrameInput({ label, error, ...input }: FrameInputProps) {
  return (
    <input
      type="text"
      inputMode="numeric"
      autoComplete="off"
      aria-label={label}
      aria-invalid={error ? true : undefined}
      {...input}
      className="type-digest inline-block h-30 w-66 border-b border-edge bg-raised text-center text-bright outline-none focus:outline-2 focus:-outline-offset-1 focus:outline-bright aria-invalid:border-b-3 aria-invalid:border-double aria-invalid:border-ember"
    />
  );
}
