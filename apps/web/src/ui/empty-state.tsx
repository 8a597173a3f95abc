import type { ReactNode } from "react";

/** Nothing here yet: says what would be here and offers the first step. */
export function EmptyState({ title, children, actions }: { title: string; children?: ReactNode; actions?: ReactNode }) {
  return (
    <div className="max-w-xl p-4">
      <h3 className="text-head">{title}</h3>
      {children && <div className="mt-1 text-ink-2">{children}</div>}
      {actions && <div className="mt-3 flex flex-wrap gap-2">{actions}</div>}
    </div>
  );
}
