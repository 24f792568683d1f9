import type { ReactNode } from "react";

/** A column of the slip: a heading on its line, and fields beneath. */
export function Column({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section aria-label={title} className="min-w-0">
      <h2 className="type-label section-line mb-12 font-medium text-text">{title}</h2>
      <div className="grid gap-12">{children}</div>
    </section>
  );
}
