import type { ReactNode } from "react";

export interface ThresholdProps {
  title: ReactNode;
  /** One or two sentences under the title. */
  words?: ReactNode;
  children?: ReactNode;
}

/** A page before sign-in: one title, one sentence, one form. */
export function Threshold({ title, words, children }: ThresholdProps) {
  return (
    <div className="mx-auto w-full max-w-1296 px-16 pt-48 pb-72 sm:px-48 sm:pt-72">
      <h1 className="type-title text-text">{title}</h1>
      {words && <p className="type-prose mt-12 max-w-560 text-soft">{words}</p>}
      <div className="mt-36 grid max-w-400 gap-16">{children}</div>
    </div>
  );
}
