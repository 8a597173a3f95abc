import type { PriceItem } from "@cleatwork/calc";
import { useState } from "react";
import { microText, parseMicro } from "../../lib/format/money.ts";

/** A price that is changed where it stands: type, Enter saves and goes to the next one, Escape puts it back. */
export function PriceCell({ item, onChange }: { item: PriceItem; onChange: (micro: number) => void }) {
  const [typed, setTyped] = useState<string | null>(null);
  const micro = typed === null ? item.unitPrice_micro : parseMicro(typed);
  const commit = () => {
    if (typed !== null && micro !== null && micro !== item.unitPrice_micro) onChange(micro);
    if (micro !== null) setTyped(null);
  };
  return (
    <input
      data-price-cell=""
      type="text"
      inputMode="decimal"
      autoComplete="off"
      aria-label={`Unit price of ${item.description}`}
      {...(micro === null
        ? { "aria-invalid": true, title: `“${typed ?? ""}” is not a price. Type one such as 1.25. The old one stays.` }
        : {})}
      value={typed ?? microText(item.unitPrice_micro)}
      onFocus={(event) => event.target.select()}
      onChange={(event) => setTyped(event.target.value)}
      onBlur={commit}
      onKeyDown={(event) => {
        if (event.key === "Escape") setTyped(null);
        const step = { Enter: event.shiftKey ? -1 : 1, ArrowDown: 1, ArrowUp: -1 }[event.key];
        if (step === undefined || micro === null) return;
        event.preventDefault();
        const cells = [...document.querySelectorAll<HTMLInputElement>("[data-price-cell]")];
        const next = cells[cells.indexOf(event.currentTarget) + step];
        if (next) next.focus();
        else commit();
      }}
      className="h-6 w-28 rounded-edge border border-transparent bg-transparent px-1 text-right font-[620] hover:border-line-strong hover:bg-sheet-hi focus:bg-sheet-hi aria-invalid:border-stop aria-invalid:bg-stop-tint"
    />
  );
}
