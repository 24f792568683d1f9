import type { ReactNode } from "react";

export interface EmptyProps {
  /** A sentence, not a label: "Nothing waits for you." */
  title: ReactNode;
  /** The heading level that suits the page. */
  level?: 1 | 2 | 3;
  failed?: boolean;
  className?: string;
  children?: ReactNode;
}

/** A place with nothing in it, or nothing that worked: what is so, and what comes next. */
export function Empty({ title, level = 2, failed, className = "", children }: EmptyProps) {
  const Heading = `h${level}` as const;
  return (
    <div className={`grid max-w-560 gap-8 ${className}`}>
      <Heading className={`type-declaration ${failed ? "text-ember" : "text-text"}`}>{title}</Heading>
      <div className={`type-body ${failed ? "text-text" : "text-soft"}`}>{children}</div>
    </div>
  );
}
