import { useId, type ComponentProps, type ReactNode } from "react";

export interface ChoiceOption<Value extends string> {
  value: Value;
  /** The word that is chosen, and then what it means in a sentence. */
  word: ReactNode;
  meaning?: ReactNode;
  /** Usually a <StandingGlyph size={24} />. */
  glyph?: ReactNode;
  disabled?: boolean;
}

export interface ChoiceProps<Value extends string> extends Omit<
  ComponentProps<"input">,
  "value" | "defaultValue" | "size" | "children"
> {
  legend: ReactNode;
  hideLegend?: boolean;
  options: readonly ChoiceOption<Value>[];
  value?: Value | undefined;
  defaultValue?: Value | undefined;
  error?: string | undefined;
  /** "declaration" for a verdict, "label" elsewhere. */
  size?: "declaration" | "label";
}

const sizes = {
  declaration: "type-declaration min-h-42 gap-16 px-16",
  label: "type-body min-h-32 gap-12 px-12",
};

/** One of a few, as rows of glyph, word and meaning with a bar at the chosen one. Works with `register(…)`. */
export function Choice<Value extends string>(props: ChoiceProps<Value>) {
  const {
    legend,
    hideLegend,
    options,
    value,
    defaultValue,
    error,
    size = "label",
    className = "",
    ...input
  } = props;
  const made = useId();
  const name = input.name ?? made;
  return (
    <fieldset className={`min-w-0 ${className}`} aria-describedby={error ? `${made}-error` : undefined}>
      <legend className={hideLegend ? "sr-only" : "type-label mb-4 text-soft"}>{legend}</legend>
      {options.map((option) => (
        <label
          key={option.value}
          className={`group flex items-center ${sizes[size]} -ml-1 cursor-pointer border-l border-edge has-checked:border-l-4 has-checked:border-bright has-checked:pl-[calc(var(--pad)-3px)] has-disabled:cursor-default has-focus-visible:outline-2 has-focus-visible:-outline-offset-2 has-focus-visible:outline-bright`}
          style={{ "--pad": size === "declaration" ? "16px" : "12px" } as React.CSSProperties}
        >
          <input
            {...input}
            type="radio"
            name={name}
            value={option.value}
            checked={value === undefined ? undefined : value === option.value}
            defaultChecked={defaultValue === undefined ? undefined : defaultValue === option.value}
            disabled={option.disabled ?? input.disabled}
            className="sr-only"
          />
          {option.glyph && <span className="flex group-not-has-checked:*:text-soft!">{option.glyph}</span>}
          <span className="text-soft group-has-disabled:text-soft">
            <span className="text-text group-has-disabled:text-soft">{option.word}</span> {option.meaning}
          </span>
        </label>
      ))}
      {error && (
        <p id={`${made}-error`} className="type-small mt-4 text-ember">
          {error}
        </p>
      )}
    </fieldset>
  );
}
