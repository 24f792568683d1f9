import Link from "next/link";
import type { ComponentProps } from "react";

/** The link that stands for its row: the row is boxed while it has the keyboard. */
export function RowLink({ className = "", ...rest }: ComponentProps<typeof Link>) {
  return (
    <Link data-row-link="" className={`text-text outline-none hover:text-bright ${className}`} {...rest} />
  );
}
