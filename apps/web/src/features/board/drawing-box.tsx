import { formatLength, meters } from "@cleatwork/calc";
import type { UnitSystem } from "@cleatwork/contracts";
import { classNames } from "../../lib/class-names.ts";
import type { DrawRunState } from "./tools/draw-run/draw-run.ts";
import { readDraft } from "./place-run.ts";

/** What is typed while a run is drawn, beside the board's lower edge. The board has the keyboard; this only shows. */
export function DrawingBox({
  state,
  pointed_m,
  units,
}: {
  state: DrawRunState & { name: "placing" };
  pointed_m: number | null;
  units: UnitSystem;
}) {
  const read = readDraft(state.draft, units);
  const cells = [
    {
      field: "length",
      label: "Length",
      text: state.draft.length,
      rest: pointed_m === null ? "point" : formatLength(meters(pointed_m), units).text,
    },
    { field: "size", label: "Size", text: state.draft.size, rest: "to sizing" },
    { field: "airflow", label: "Airflow, ends it", text: state.draft.airflow, rest: "goes on" },
  ] as const;
  return (
    <div
      className="pointer-events-none absolute bottom-3 right-3 border border-b-float-line bg-b-float text-b-float-ink shadow-float"
      aria-live="polite"
    >
      <div className="flex">
        {cells.map(({ field, label, text, rest }) => (
          <div
            key={field}
            className={classNames(
              "min-w-28 border-r border-b-float-line px-3 py-1.5 last:border-r-0",
              state.field === field && "outline-2 -outline-offset-2 outline-scribe",
            )}
          >
            <div className="label-width text-label">{label}</div>
            <div className="text-head font-semibold">
              {text === "" ? <span className="font-normal opacity-80">{rest}</span> : text}
              {state.field === field && <span aria-hidden>|</span>}
            </div>
          </div>
        ))}
      </div>
      <p className="border-t border-b-float-line px-3 py-1 text-help">
        {read.ok ? "Tab next field · Enter or click places · Esc drops the run" : read.message}
      </p>
    </div>
  );
}
