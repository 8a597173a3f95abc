import { useId, type ReactNode } from "react";
import { classNames } from "../lib/class-names.ts";
import { SeverityMark } from "./severity.tsx";

export interface FieldSlots {
  readonly id: string;
  readonly "aria-describedby"?: string;
  readonly "aria-invalid"?: true;
}

export interface FieldProps {
  readonly label: string;
  readonly hint?: ReactNode;
  /** Which value, why not, what is allowed; shown under the control and read with it. */
  readonly error?: string | undefined;
  readonly hideLabel?: boolean;
  readonly aside?: ReactNode;
  readonly className?: string;
}

/** Label, control, hint and error, tied together for eyes and for ears. */
export function Field({
  label,
  hint,
  error,
  hideLabel,
  aside,
  className,
  children,
}: FieldProps & { readonly children: (slots: FieldSlots) => ReactNode }) {
  const id = useId();
  const described = [hint ? `${id}-hint` : "", error ? `${id}-error` : ""].filter(Boolean).join(" ");
  return (
    <div className={classNames("min-w-0", className)}>
      <div className={classNames("mb-1 flex items-baseline justify-between gap-2", hideLabel && "sr-only")}>
        <label htmlFor={id} className="label-width text-help font-medium text-ink-2">
          {label}
        </label>
        {aside}
      </div>
      {children({
        id,
        ...(described ? { "aria-describedby": described } : {}),
        ...(error ? { "aria-invalid": true as const } : {}),
      })}
      {hint && (
        <p id={`${id}-hint`} className="mt-1 text-help text-ink-3">
          {hint}
        </p>
      )}
      {error && (
        <p id={`${id}-error`} className="mt-1 flex items-start gap-1.5 text-help font-semibold text-stop-ink">
          <span className="mt-px">
            <SeverityMark severity="stop" />
          </span>
          <span>{error}</span>
        </p>
      )}
    </div>
  );
}

export const controlLook =
  "block w-full min-w-0 rounded-edge border border-line-strong bg-sheet-hi px-2 text-ink placeholder:text-ink-3 " +
  "aria-invalid:border-stop aria-invalid:border-b-2 disabled:bg-transparent disabled:border-dashed disabled:text-ink-2";
