import Link from "next/link";
import type { ComponentProps } from "react";

const look = "action cursor-pointer rounded";

/** A word that leads somewhere. */
export function TextLink({ className = "", ...rest }: ComponentProps<typeof Link>) {
  return <Link className={`${look} ${className}`} {...rest} />;
}

/** A word that does something here. */
export function TextAction({ className = "", type, ...rest }: ComponentProps<"button">) {
  return <button type={type ?? "button"} className={`${look} ${className}`} {...rest} />;
}
