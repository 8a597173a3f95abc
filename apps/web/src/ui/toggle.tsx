import { ToggleGroup } from "radix-ui";
import type { ReactNode } from "react";

/** One of a few, side by side. */
export function Toggle<V extends string>({
  label,
  value,
  onChange,
  choices,
}: {
  label: string;
  value: V;
  onChange: (value: V) => void;
  choices: readonly { readonly value: V; readonly label: ReactNode; readonly name?: string }[];
}) {
  return (
    <ToggleGroup.Root
      type="single"
      aria-label={label}
      value={value}
      onValueChange={(next) => {
        if (next) onChange(next as V);
      }}
      className="inline-flex rounded-edge border border-line-strong bg-sheet"
    >
      {choices.map((choice) => (
        <ToggleGroup.Item
          key={choice.value}
          value={choice.value}
          {...(choice.name ? { "aria-label": choice.name } : {})}
          className="h-[26px] border-r border-line px-2.5 text-help font-medium text-ink-2 last:border-r-0 hover:bg-dye-tint data-[state=on]:bg-dye data-[state=on]:text-on-dye"
        >
          {choice.label}
        </ToggleGroup.Item>
      ))}
    </ToggleGroup.Root>
  );
}
