import { useId, type ComponentProps, type ReactNode } from "react";
import { joinIds } from "./described";
import { FieldRow, type FieldState } from "./field-row";

export interface SelectFieldProps extends ComponentProps<"select">, FieldState {
  label: ReactNode;
  boxClassName?: string;
}

/** One of a few words, in a figure's place. Pass <option>s as children. */
export function SelectField(props: SelectFieldProps) {
  const { label, consequence, error, departure, computed, boxClassName, className, children, ...select } =
    props;
  const made = useId();
  const id = select.id ?? made;
  const line = `${id}-line`;
  return (
    <FieldRow
      {...{ label, consequence, error, departure, computed, boxClassName, className }}
      controlId={id}
      lineId={line}
      disabled={select.disabled}
    >
      <select
        {...select}
        id={id}
        aria-invalid={error ? true : undefined}
        aria-describedby={joinIds(line, select["aria-describedby"])}
        className={`type-figure w-full min-w-0 cursor-pointer appearance-none bg-transparent text-right outline-none [text-align-last:right] ${
          select.disabled ? "text-soft" : "text-bright"
        }`}
      >
        {children}
      </select>
      <span
        aria-hidden="true"
        className="h-0 w-0 shrink-0 self-center border-x-4 border-t-5 border-x-transparent border-t-soft"
      />
    </FieldRow>
  );
}
