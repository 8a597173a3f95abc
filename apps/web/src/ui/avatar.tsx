import { initials } from "../lib/initials.ts";
import { classNames } from "../lib/class-names.ts";

/** A person as two letters. Beside their name it is decoration. */
export function Avatar({ name, quiet }: { name: string; quiet?: boolean }) {
  return (
    <span
      aria-hidden
      className={classNames(
        "label-width grid size-7 shrink-0 place-items-center rounded-edge text-label font-[640]",
        quiet ? "border border-dashed border-line-strong text-ink-2" : "bg-ink-2 text-sheet",
      )}
    >
      {initials(name)}
    </span>
  );
}
