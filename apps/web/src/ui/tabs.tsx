import { Tabs as Radix } from "radix-ui";
import type { ReactNode } from "react";

/** Views of one thing inside a panel. Screens of their own are links in the top bar instead. */
export function Tabs({
  label,
  value,
  onChange,
  tabs,
}: {
  label: string;
  value: string;
  onChange: (value: string) => void;
  tabs: readonly { readonly value: string; readonly label: ReactNode; readonly content: ReactNode }[];
}) {
  return (
    <Radix.Root value={value} onValueChange={onChange}>
      <Radix.List aria-label={label} className="flex gap-1 border-b border-line px-4">
        {tabs.map((tab) => (
          <Radix.Trigger
            key={tab.value}
            value={tab.value}
            className="-mb-px border-b-2 border-transparent px-2 py-2 font-medium text-ink-2 hover:text-ink data-[state=active]:border-dye data-[state=active]:text-dye-ink"
          >
            {tab.label}
          </Radix.Trigger>
        ))}
      </Radix.List>
      {tabs.map((tab) => (
        <Radix.Content key={tab.value} value={tab.value}>
          {tab.content}
        </Radix.Content>
      ))}
    </Radix.Root>
  );
}
