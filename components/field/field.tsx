import { useId, type ComponentProps, type ReactNode } from "react";
import { joinIds } from "./described";
import { FieldRow, type FieldState } from "./field-row";

export interface FieldProps extends Omit<ComponentProps<"input">, "children">, FieldState {
  label: ReactNode;
  unit?: ReactNode;
  boxClassName?: string;
}

/** A figure: label, value in mono, unit, and what follows from it. Spread react-hook-form's `register(…)` into it. */
export function Field({
  label,
  unit,
  consequence,
  error,
  departure,
  computed,
  boxClassName,
  className,
  ...input
}: FieldProps) {
  const made = useId();
  const id = input.id ?? made;
  const line = `${id}-line`;
  const unitId = `${id}-unit`;
  return (
    <FieldRow
      {...{ label, consequence, error, departure, computed, boxClassName, className }}
      controlId={id}
      lineId={line}
      disabled={input.disabled}
    >
      <input
        type="text"
        inputMode="decimal"
        autoComplete="off"
        spellCheck={false}
        {...input}
        id={id}
        readOnly={computed || input.readOnly}
        aria-invalid={error ? true : undefined}
        aria-describedby={joinIds(unit !== undefined && unitId, line, input["aria-describedby"])}
        className={`type-figure w-full min-w-0 bg-transparent text-right outline-none ${
          input.disabled ? "text-soft" : "text-bright"
        }`}
      />
      {unit !== undefined && (
        <span id={unitId} className="type-small whitespace-nowrap text-soft">
          {unit}
        </span>
      )}
    </FieldRow>
  );
}
