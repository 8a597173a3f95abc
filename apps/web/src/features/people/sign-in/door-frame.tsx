import type { ReactNode } from "react";
import { Mark } from "../../../ui/icons/mark.tsx";
import { PatternDrawing } from "./pattern-drawing.tsx";

/** The pages before the company: a drawing on layout dye at the left, the form on a sheet at the right. */
export function DoorFrame({ children }: { children: ReactNode }) {
  return (
    <div className="grid min-h-dvh bg-sheet lg:grid-cols-[5fr_4fr]">
      <div data-ground="dye" className="flex flex-col bg-b-ground px-6 py-6 text-b-label lg:px-10 lg:py-9">
        <p className="flex items-center gap-2 text-title font-[640] lg:text-2xl">
          <Mark size={32} />
          Cleatwork
        </p>
        <div className="my-auto grid place-items-center py-10 max-lg:hidden">
          <PatternDrawing />
        </div>
        <p className="text-ink-2 max-lg:hidden">
          <b className="font-[620] text-ink">Square to round, 24 × 18 to 16 Ø, 14 in. tall.</b> Full pattern by
          triangulation, seam on the short line, true lengths in inches, before allowance.
        </p>
      </div>
      <main className="flex justify-center border-line-strong px-6 py-10 lg:items-center lg:border-l">
        <div className="w-full max-w-[336px] lg:pl-0">{children}</div>
      </main>
    </div>
  );
}
