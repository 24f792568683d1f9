import type { ReactNode } from "react";

export interface TextFrameProps {
  label: ReactNode;
  /** One line that says what the words are for, or what will happen to them. */
  hint?: ReactNode;
  /** Why they are refused. It takes the hint's place. */
  error?: string | undefined;
  className?: string | undefined;
}

export const textBox =
  "w-full min-w-0 rounded border bg-raised text-text outline-none focus:border-bright focus:outline-1 focus:outline-solid focus:-outline-offset-2 focus:outline-bright " +
  "disabled:border-dashed disabled:border-rule disabled:bg-transparent disabled:text-soft aria-invalid:border-double aria-invalid:border-b-3 aria-invalid:border-ember";

/** The label above and the line beneath words that are written into a box. */
export function TextFrame(
  props: TextFrameProps & { controlId: string; lineId: string; children: ReactNode },
) {
  const { label, hint, error, className = "", controlId, lineId, children } = props;
  return (
    <div className={`grid min-w-0 gap-4 ${className}`}>
      <label htmlFor={controlId} className="type-label text-soft">
        {label}
      </label>
      {children}
      {(error ?? hint) && (
        <p id={lineId} className={`type-small ${error ? "text-ember" : "text-soft"}`}>
          {error ?? hint}
        </p>
      )}
    </div>
  );
}
