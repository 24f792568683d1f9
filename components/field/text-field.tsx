import { useId, type ComponentProps } from "react";
import { joinIds } from "./described";
import { textBox, TextFrame, type TextFrameProps } from "./text-frame";

export interface TextFieldProps extends Omit<ComponentProps<"input">, "children">, TextFrameProps {
  /** Words in the sans, figures and codes in mono, or the digest's larger figures. */
  face?: "words" | "figures" | "digest";
}

const faces = { words: "type-body h-36", figures: "type-figure h-36", digest: "type-digest h-40" };

/** A line of words under its label: a name, an address, a password, a code. Works with `register(…)`. */
export function TextField({ label, hint, error, face = "words", className, ...input }: TextFieldProps) {
  const made = useId();
  const id = input.id ?? made;
  const line = `${id}-line`;
  return (
    <TextFrame {...{ label, hint, error, className }} controlId={id} lineId={line}>
      <input
        type="text"
        {...input}
        id={id}
        aria-invalid={error ? true : undefined}
        aria-describedby={joinIds(Boolean(error ?? hint) && line, input["aria-describedby"])}
        className={`${textBox} ${error ? "" : "border-edge"} px-12 ${faces[face]}`}
      />
    </TextFrame>
  );
}
