import type { ComponentProps, ReactNode } from "react";

export interface CheckBoxProps extends Omit<ComponentProps<"input">, "children"> {
  label: ReactNode;
  /** For the boxes of a table, whose row says the rest: the label is read aloud but not drawn. */
  hideLabel?: boolean;
}

// The mark is one stroke through the box, from its lower left corner beyond its upper right.
const mark =
  "relative h-14 w-14 shrink-0 cursor-pointer appearance-none rounded border border-edge bg-transparent " +
  "after:absolute after:-left-2 after:top-5 after:h-2 after:w-18 after:-rotate-45 after:bg-bright after:opacity-0 " +
  "checked:after:opacity-100 disabled:border-dashed disabled:border-rule";

/** A box that is struck through when chosen. Its target is 24 px even where it is drawn smaller. */
export function CheckBox({ label, hideLabel, className = "", ...input }: CheckBoxProps) {
  return (
    <label className={`inline-flex min-h-24 min-w-24 cursor-pointer items-center gap-8 ${className}`}>
      <input type="checkbox" {...input} className={mark} />
      <span className={hideLabel ? "sr-only" : "type-label text-text"}>{label}</span>
    </label>
  );
}
