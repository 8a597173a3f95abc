import { Dialog as Radix } from "radix-ui";
import type { ReactNode } from "react";
import { CloseIcon } from "./icons/icon.tsx";
import { classNames } from "../lib/class-names.ts";

/** A dialog that keeps the focus, closes with Escape and gives the focus back. */
export function Dialog({
  open,
  onOpenChange,
  title,
  description,
  children,
  footer,
  wide,
}: {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: string;
  description?: ReactNode;
  children: ReactNode;
  /** Buttons that stay in view while the content scrolls. */
  footer?: ReactNode;
  wide?: boolean;
}) {
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      <Radix.Portal>
        <Radix.Overlay className="fixed inset-0 z-40 bg-veil" />
        <Radix.Content
          {...(description ? {} : { "aria-describedby": undefined })}
          className={classNames(
            "hem hem-live float-in fixed! left-1/2 top-[10vh] z-50 flex max-h-[80vh] w-[calc(100vw-2rem)] -translate-x-1/2 flex-col shadow-float",
            wide ? "max-w-3xl" : "max-w-lg",
          )}
        >
          <div className="flex min-h-10 items-center gap-3 border-b border-line pl-4 pr-2">
            <Radix.Title className="text-head">{title}</Radix.Title>
            <Radix.Close
              aria-label="Close"
              className="ml-auto grid size-7 place-items-center rounded-edge text-ink-2 hover:bg-dye-tint"
            >
              <CloseIcon />
            </Radix.Close>
          </div>
          <div className="min-h-0 overflow-auto p-4">
            {description && <Radix.Description className="mb-4 text-ink-2">{description}</Radix.Description>}
            {children}
          </div>
          {footer && <div className="flex flex-wrap justify-end gap-2 border-t border-line px-4 py-3">{footer}</div>}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}

/** The buttons of a form in a dialog; they stay in view while its fields scroll. */
export function DialogActions({ children }: { children: ReactNode }) {
  return (
    <div className="sticky -bottom-4 -mx-4 -mb-4 mt-2 flex flex-wrap justify-end gap-2 border-t border-line bg-sheet px-4 py-3">
      {children}
    </div>
  );
}
