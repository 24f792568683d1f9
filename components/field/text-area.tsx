import { useId, type ComponentProps } from "react";
import { joinIds } from "./described";
import { textBox, TextFrame, type TextFrameProps } from "./text-frame";

export interface TextAreaProps extends ComponentProps<"textarea">, TextFrameProps {}

/** Prose under its label, in the serif it will be read in. Works with `register(…)`. */
export function TextArea({ label, hint, error, className, rows = 3, ...area }: TextAreaProps) {
  const made = useId();
  const id = area.id ?? made;
  const line = `${id}-line`;
  return (
    <TextFrame {...{ label, hint, error, className }} controlId={id} lineId={line}>
      <textarea
        {...area}
        rows={rows}
        id={id}
        aria-invalid={error ? true : undefined}
        aria-describedby={joinIds(Boolean(error ?? hint) && line, area["aria-describedby"])}
        className={`${textBox} ${error ? "" : "border-edge"} type-prose resize-y px-14 py-8`}
      />
    </TextFrame>
  );
}
