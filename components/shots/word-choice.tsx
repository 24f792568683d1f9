"use client";

import { DropdownMenu } from "radix-ui";

export interface WordChoiceProps {
  /** What is chosen, as it is spoken: "which shots". */
  label: string;
  value: string;
  options: readonly { value: string; word: string }[];
  onChoose: (value: string) => void;
}

/** A word of a sentence that can be changed for another. */
export function WordChoice({ label, value, options, onChoose }: WordChoiceProps) {
  const word = options.find((option) => option.value === value)?.word ?? value;
  return (
    <DropdownMenu.Root>
      <DropdownMenu.Trigger aria-label={`${label}: ${word}`} className="action cursor-pointer rounded">
        {word}
      </DropdownMenu.Trigger>
      <DropdownMenu.Portal>
        <DropdownMenu.Content
          align="start"
          sideOffset={6}
          className="type-body z-40 max-h-[60vh] min-w-144 overflow-y-auto rounded border border-edge bg-ground py-4 text-text"
        >
          <DropdownMenu.RadioGroup value={value} onValueChange={onChoose}>
            {options.map((option) => (
              <DropdownMenu.RadioItem
                key={option.value}
                value={option.value}
                className="flex min-h-28 cursor-pointer items-center border-l-4 border-transparent px-12 outline-none data-highlighted:bg-raised data-highlighted:text-bright data-[state=checked]:border-bright"
              >
                {option.word}
              </DropdownMenu.RadioItem>
            ))}
          </DropdownMenu.RadioGroup>
        </DropdownMenu.Content>
      </DropdownMenu.Portal>
    </DropdownMenu.Root>
  );
}
