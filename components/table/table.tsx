import type { ComponentProps } from "react";

/** A table of the studio: hairlines between rows, no boxes. Give it a <caption className="sr-only"> or an aria-label. */
export function Table({ className = "", ...rest }: ComponentProps<"table">) {
  return <table className={`type-label w-full border-collapse text-left ${className}`} {...rest} />;
}

export function HeadCell({ className = "", scope, ...rest }: ComponentProps<"th">) {
  return (
    <th
      scope={scope ?? "col"}
      className={`type-small border-b border-text px-12 pb-8 text-left align-bottom font-normal text-soft first:pl-0 last:pr-0 ${className}`}
      {...rest}
    />
  );
}

export interface RowProps extends ComponentProps<"tr"> {
  /** Chosen for an act: a bar stands at its left. */
  chosen?: boolean;
  /** Out of use, as an omitted shot is. */
  faint?: boolean;
}

/** A row: raised under the pointer, barred when chosen, boxed while the keyboard is on its RowLink. */
export function Row({ chosen, faint, className = "", ...rest }: RowProps) {
  const bar =
    "[&>:first-child]:before:absolute [&>:first-child]:before:inset-y-0 [&>:first-child]:before:-left-8 [&>:first-child]:before:w-4 [&>:first-child]:before:bg-text";
  return (
    <tr
      data-chosen={chosen || undefined}
      className={`border-b border-hair transition-colors hover:bg-raised has-[[data-row-link]:focus-visible]:outline-2 has-[[data-row-link]:focus-visible]:-outline-offset-2 has-[[data-row-link]:focus-visible]:outline-bright [&>:first-child]:relative ${chosen ? bar : ""} ${faint ? "text-soft" : ""} ${className}`}
      {...rest}
    />
  );
}

export function Cell({ className = "", ...rest }: ComponentProps<"td">) {
  return <td className={`h-37 px-12 align-middle first:pl-0 last:pr-0 ${className}`} {...rest} />;
}

/** A cell of figures: mono, set right. */
export function FigureCell({ className = "", ...rest }: ComponentProps<"td">) {
  return <Cell className={`type-figure text-right whitespace-nowrap ${className}`} {...rest} />;
}

/** The heading of a group of rows, on its own strong line. */
export function GroupRow({ className = "", children, colSpan }: ComponentProps<"th">) {
  return (
    <tr>
      <th
        scope="rowgroup"
        colSpan={colSpan}
        className={`border-b border-text pt-24 pb-8 text-left font-normal ${className}`}
      >
        {children}
      </th>
    </tr>
  );
}
