import { DropdownMenu as Radix } from "radix-ui";
import type { ReactNode } from "react";
import { CheckIcon } from "./icons/icon.tsx";

/** A menu of actions under a button. */
export function Menu({
  trigger,
  children,
  align = "end",
}: {
  trigger: ReactNode;
  children: ReactNode;
  align?: "start" | "end";
}) {
  return (
    <Radix.Root>
      <Radix.Trigger asChild>{trigger}</Radix.Trigger>
      <Radix.Portal>
        <Radix.Content
          align={align}
          sideOffset={4}
          collisionPadding={8}
          className="float-in z-50 min-w-48 border border-line-strong bg-sheet-hi py-1 text-ink shadow-float"
        >
          {children}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}

const item =
  "flex min-h-8 cursor-pointer select-none items-center gap-2 px-3 outline-none data-[highlighted]:bg-dye-tint data-[disabled]:cursor-not-allowed data-[disabled]:text-ink-3";

export function MenuItem({
  onSelect,
  children,
  disabled,
}: {
  onSelect: () => void;
  children: ReactNode;
  disabled?: boolean;
}) {
  return (
    <Radix.Item className={item} onSelect={onSelect} disabled={disabled ?? false}>
      {children}
    </Radix.Item>
  );
}

export function MenuChoices({
  label,
  value,
  onChange,
  choices,
}: {
  label: string;
  value: string;
  onChange: (value: string) => void;
  choices: readonly { readonly value: string; readonly label: ReactNode }[];
}) {
  return (
    <Radix.RadioGroup value={value} onValueChange={onChange}>
      <MenuLabel>{label}</MenuLabel>
      {choices.map((choice) => (
        <Radix.RadioItem key={choice.value} value={choice.value} className={item}>
          <span className="w-4">
            <Radix.ItemIndicator>
              <CheckIcon />
            </Radix.ItemIndicator>
          </span>
          {choice.label}
        </Radix.RadioItem>
      ))}
    </Radix.RadioGroup>
  );
}

export function MenuLabel({ children }: { children: ReactNode }) {
  return <Radix.Label className="label-width px-3 pb-1 pt-2 text-label text-ink-3">{children}</Radix.Label>;
}

export const MenuSeparator = () => <Radix.Separator className="my-1 h-px bg-line" />;
