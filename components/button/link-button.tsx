import Link from "next/link";
import type { ComponentProps } from "react";
import { buttonLook } from "./button";

export interface LinkButtonProps extends ComponentProps<typeof Link> {
  look?: "primary" | "plain";
  size?: "normal" | "large";
}

/** A link that looks like a button: the one act of a sentence that leads to another page. */
export function LinkButton({ look = "plain", size = "normal", className = "", ...rest }: LinkButtonProps) {
  return <Link className={`${buttonLook(look, size)} ${className}`} {...rest} />;
}
