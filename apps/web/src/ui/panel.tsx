import type { ReactNode } from "react";
import { classNames } from "../lib/class-names.ts";

/** A sheet with a folded edge. `live` marks the one panel in use. */
export function Panel({
  live,
  className,
  children,
  label,
}: {
  live?: boolean;
  className?: string;
  children: ReactNode;
  label?: string;
}) {
  return (
    <section
      {...(label ? { "aria-label": label } : {})}
      className={classNames("hem min-w-0", live && "hem-live", className)}
    >
      {children}
    </section>
  );
}

export function PanelHead({
  title,
  fact,
  children,
  level = 2,
}: {
  title: string;
  fact?: ReactNode;
  children?: ReactNode;
  level?: 2 | 3;
}) {
  const Heading = level === 2 ? "h2" : "h3";
  return (
    <div className="flex min-h-10 flex-wrap items-center gap-x-3 gap-y-1 border-b border-line px-4 py-1">
      <Heading className="text-head">{title}</Heading>
      {fact !== undefined && <span className="label-width text-label text-ink-3">{fact}</span>}
      {children && <div className="ml-auto flex flex-wrap items-center gap-2">{children}</div>}
    </div>
  );
}

export function PanelBody({ className, children }: { className?: string; children: ReactNode }) {
  return <div className={classNames("p-4", className)}>{children}</div>;
}
