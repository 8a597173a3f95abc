import { Tooltip as Radix } from "radix-ui";
import type { ReactNode } from "react";

/** A few words about a control. Never the only place where they stand. Needs the provider from the app. */
export function Tooltip({
  words,
  side = "top",
  children,
}: {
  words: ReactNode;
  side?: "top" | "right" | "bottom" | "left";
  children: ReactNode;
}) {
  return (
    <Radix.Root>
      <Radix.Trigger asChild>{children}</Radix.Trigger>
      <Radix.Portal>
        <Radix.Content
          side={side}
          sideOffset={6}
          collisionPadding={8}
          className="float-in z-50 max-w-72 border border-line-strong bg-sheet-hi px-2 py-1 text-help text-ink shadow-float"
        >
          {words}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}

export const TooltipProvider = ({ children }: { children: ReactNode }) => (
  <Radix.Provider delayDuration={400} skipDelayDuration={200}>
    {children}
  </Radix.Provider>
);
