import { classNames } from "../lib/class-names.ts";

export type Severity = "stop" | "warn" | "note" | "good";

const ink: Record<Severity, string> = {
  stop: "text-stop-ink",
  warn: "text-warn-ink",
  note: "text-note-ink",
  good: "text-good-ink",
};
const said: Record<Severity, string> = { stop: "Stop", warn: "Warning", note: "Note", good: "Clear" };

/** Shape first (octagon, triangle, square, diamond), then color: a severity can be told in grey. */
export function SeverityMark({ severity, size = 14, label }: { severity: Severity; size?: number; label?: string }) {
  return (
    <svg
      width={size}
      height={size}
      viewBox="0 0 16 16"
      className="shrink-0"
      {...(label === undefined ? { "aria-hidden": true } : { role: "img", "aria-label": label || said[severity] })}
    >
      {severity === "stop" && (
        <>
          <path d="M5 1h6l4 4v6l-4 4H5l-4-4V5z" className="fill-stop" />
          <path d="M4.5 8h7" className="stroke-on-stop" strokeWidth={2} />
        </>
      )}
      {severity === "warn" && (
        <>
          <path d="M8 1l7.5 14H.5z" className="fill-warn" />
          <path d="M8 6v4.5M8 12v1.6" className="stroke-on-warn" strokeWidth={1.8} />
        </>
      )}
      {severity === "note" && (
        <>
          <path d="M1 1h14v14H1z" className="fill-note" />
          <path d="M8 7v5M8 4v1.7" className="stroke-on-note" strokeWidth={1.8} />
        </>
      )}
      {severity === "good" && (
        <>
          <path d="M8 .5L15.5 8 8 15.5.5 8z" className="fill-good" />
          <path d="M5 8.200l2.200 2.200L11 6.200" className="fill-none stroke-on-good" strokeWidth={1.7} />
        </>
      )}
    </svg>
  );
}

/** Shape and words in the severity's ink. */
export function SeverityText({
  severity,
  children,
  className,
}: {
  severity: Severity;
  children: React.ReactNode;
  className?: string;
}) {
  return (
    <span
      className={classNames("inline-flex items-center gap-1.5 align-middle font-semibold", ink[severity], className)}
    >
      <SeverityMark severity={severity} />
      <span>{children}</span>
    </span>
  );
}
