import { useId, type ComponentProps, type ReactNode } from "react";

const shape =
  "inline-flex min-h-36 items-center justify-center rounded px-16 text-center font-medium transition-colors cursor-pointer";

const looks = {
  primary: "border border-fill bg-fill text-ground hover:border-bright hover:bg-bright",
  plain: "border border-edge text-text hover:border-bright hover:bg-raised hover:text-bright",
  missing: "border border-dashed border-rule text-soft cursor-default",
};

export const buttonLook = (look: "primary" | "plain", size: "normal" | "large" = "normal") =>
  `${size === "large" ? "type-body min-h-40" : "type-label"} ${shape} ${looks[look]}`;

export interface ButtonProps extends Omit<ComponentProps<"button">, "disabled"> {
  look?: "primary" | "plain";
  size?: "normal" | "large";
  /** The sentence that says what is missing. While given, the button cannot act and the sentence stands beside it. */
  missing?: ReactNode;
  /** The act is under way: the button cannot be pressed again. */
  busy?: boolean;
}

/** A button; `type` is "button" unless said otherwise. It is never greyed out without its reason beside it. */
export function Button({
  look = "plain",
  size = "normal",
  missing,
  busy,
  className = "",
  type,
  ...rest
}: ButtonProps) {
  if (!missing)
    return (
      <button
        type={type ?? "button"}
        className={`${buttonLook(look, size)} ${className}`}
        aria-busy={busy || undefined}
        aria-disabled={busy || undefined}
        {...rest}
        onClick={busy ? (event) => event.preventDefault() : rest.onClick}
      />
    );
  return <MissingButton {...rest} size={size} missing={missing} className={className} />;
}

function MissingButton({ missing, size, className, children, id }: ButtonProps) {
  const sentence = useId();
  return (
    <span className="inline-flex flex-wrap items-center gap-12">
      <button
        type="button"
        id={id}
        disabled
        aria-describedby={sentence}
        className={`${size === "large" ? "type-body min-h-40" : "type-label"} ${shape} ${looks.missing} ${className}`}
      >
        {children}
      </button>
      <span id={sentence} className="type-label text-soft">
        {missing}
      </span>
    </span>
  );
}
