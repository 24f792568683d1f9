import type { ReactNode } from "react";

export interface FieldState {
  /** What follows from the value, or where it came from: one line beneath it. */
  consequence?: ReactNode;
  /** Why the value is refused. It takes the consequence's place. */
  error?: string | undefined;
  /** The letter of the departure this value makes, or true before letters are given. */
  departure?: string | boolean;
  /** The value follows from others and cannot be written. */
  computed?: boolean;
}

export interface FieldRowProps extends FieldState {
  controlId: string;
  lineId: string;
  label: ReactNode;
  disabled?: boolean | undefined;
  className?: string;
  /** Classes for the width of the value's box. */
  boxClassName?: string;
  children: ReactNode;
}

const box =
  "flex h-27 min-w-0 items-baseline justify-end gap-6 pb-4 pt-2 outline-offset-2 " +
  "focus-within:border-b-2 focus-within:border-solid focus-within:border-bright focus-within:bg-raised focus-within:px-8 " +
  "focus-within:outline focus-within:outline-1 focus-within:outline-bright";

function underline({
  error,
  departure,
  computed,
  disabled,
}: FieldState & { disabled?: boolean | undefined }): string {
  if (error) return "border-b-3 border-double border-ember";
  if (computed) return "border-b border-dotted border-rule";
  if (disabled) return "border-b border-dashed border-rule";
  if (departure) return "border-b border-dashed border-ember";
  return "border-b border-edge";
}

/** A label, the box its value stands in, and the line beneath: the frame that every figure field shares. */
export function FieldRow(props: FieldRowProps) {
  const {
    controlId,
    lineId,
    label,
    consequence,
    error,
    departure,
    className = "",
    boxClassName = "max-w-174 min-w-72",
  } = props;
  return (
    <div className={`grid min-w-0 gap-4 ${className}`}>
      <div className="flex min-w-0 items-baseline justify-between gap-12">
        <label htmlFor={controlId} className="type-label min-w-min text-soft">
          {label}
          {departure && <DepartureMark letter={departure} />}
        </label>
        <div className={`${box} flex-1 ${boxClassName} ${underline(props)}`}>{props.children}</div>
      </div>
      <p
        id={lineId}
        className={`type-figure-small min-h-16 text-right ${error ? "text-ember" : "text-soft"}`}
      >
        {error ?? consequence}
      </p>
    </div>
  );
}

function DepartureMark({ letter }: { letter: string | boolean }) {
  if (letter === true) return <span className="sr-only">, a departure</span>;
  return (
    <sup className="ml-4 text-ember">
      <span className="sr-only">, departure</span> {letter}
    </sup>
  );
}
