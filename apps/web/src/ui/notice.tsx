import type { ReactNode } from "react";
import { classNames } from "../lib/class-names.ts";
import { SeverityMark, type Severity } from "./severity.tsx";

const tints: Record<Severity, string> = {
  stop: "border-stop bg-stop-tint",
  warn: "border-warn bg-warn-tint",
  note: "border-note bg-note-tint",
  good: "border-good bg-good-tint",
};

/** A message that stays until what it is about changes. Stops interrupt a screen reader, the rest wait their turn. */
export function Notice({
  severity,
  title,
  children,
  actions,
  className,
}: {
  severity: Severity;
  title: string;
  children?: ReactNode;
  actions?: ReactNode;
  className?: string;
}) {
  return (
    <div
      role={severity === "stop" ? "alert" : "status"}
      className={classNames("flex gap-2 border border-l-4 px-3 py-2 text-ink", tints[severity], className)}
    >
      <span className="mt-[3px]">
        <SeverityMark severity={severity} />
      </span>
      <div className="min-w-0">
        <p className="font-semibold">{title}</p>
        {children && <div className="text-ink-2">{children}</div>}
        {actions && <div className="mt-2 flex flex-wrap gap-2">{actions}</div>}
      </div>
    </div>
  );
}
