import type { ComponentPropsWithRef, ReactNode } from "react";
import { classNames } from "../lib/class-names.ts";

type Rank = "primary" | "plain" | "bare" | "danger";
type Size = "small" | "normal" | "touch";

const ranks: Record<Rank, string> = {
  primary: "border-dye bg-dye text-on-dye hover:bg-dye-hover hover:border-dye-hover",
  plain: "border-line-strong bg-sheet-hi text-ink hover:bg-dye-tint hover:border-dye",
  bare: "border-transparent text-ink hover:bg-dye-tint",
  danger: "border-stop bg-sheet-hi text-stop-ink hover:bg-stop-tint",
};
const sizes: Record<Size, string> = {
  small: "h-7 px-2 text-help gap-1.5",
  normal: "h-8 px-3 text-body gap-2",
  touch: "h-12 px-4 text-head gap-2",
};

/** Also for links that look like buttons; those are in link-button.tsx, so that this file needs no router. */
export function buttonLook(rank: Rank, size: Size, className?: string) {
  return classNames(
    "inline-flex select-none items-center justify-center whitespace-nowrap rounded-edge border font-[560] no-underline transition-colors",
    "disabled:cursor-not-allowed disabled:border-dashed disabled:border-line-strong disabled:bg-transparent disabled:text-ink-3",
    ranks[rank],
    sizes[size],
    className,
  );
}

export interface ButtonLook {
  readonly rank?: Rank;
  readonly size?: Size;
}

export type ButtonProps = ButtonLook & ComponentPropsWithRef<"button"> & { readonly busy?: boolean };

/** While busy it stays where it is and keeps the focus; a second press does nothing. */
export function Button({ rank = "plain", size = "normal", busy, className, children, onClick, ...rest }: ButtonProps) {
  return (
    <button
      type="button"
      {...rest}
      {...(busy ? { "aria-busy": true, "aria-disabled": true } : {})}
      className={classNames(buttonLook(rank, size, className), busy && "opacity-70")}
      onClick={(event) => {
        if (busy) event.preventDefault();
        else onClick?.(event);
      }}
    >
      {children}
    </button>
  );
}

/** A square button with an icon; the label is its name and its tooltip. */
export function IconButton({
  label,
  children,
  size = "normal",
  rank = "bare",
  className,
  ...rest
}: Omit<ButtonProps, "children"> & { readonly label: string; readonly children: ReactNode }) {
  const side = size === "touch" ? "w-12" : size === "small" ? "w-7" : "w-8";
  return (
    <Button
      {...rest}
      rank={rank}
      size={size}
      aria-label={label}
      title={label}
      className={classNames(side, "px-0", className)}
    >
      {children}
    </Button>
  );
}
