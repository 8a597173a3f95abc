import type { ReactNode } from "react";
import { Mark } from "../../../ui/icons/mark.tsx";
import { PatternDrawing } from "./pattern-drawing.tsx";
import { ViewsDrawing } from "./views-drawing.tsx";

/** The pages before the company: a drawing on layout dye at the left, the form on a sheet at the right. */
export function DoorFrame({ children }: { children: ReactNode }) {
  return (
    <div className="grid min-h-dvh bg-sheet max-lg:content-start lg:grid-cols-[5fr_4fr]">
      <header data-ground="dye" className="flex flex-col bg-b-ground px-6 py-5 text-b-label lg:px-10 lg:py-9">
        <p className="flex items-center gap-2 text-title font-[640] lg:text-2xl">
          <Mark size={32} />
          Cleatwork
        </p>
        <div className="my-auto grid gap-8 py-6 max-lg:hidden">
          <ViewsDrawing />
          <PatternDrawing />
        </div>
        <p className="text-ink-2 max-lg:hidden">
          <b className="font-[620] text-ink">Square to round, 24 × 18 to 16 Ø, 14 in. tall.</b> Full pattern by
          triangulation, seam on the short line, true lengths in inches, before allowance.
        </p>
      </header>
      <main className="door-hem flex justify-center px-6 py-10 lg:items-center">
        <div className="w-full max-w-[336px]">{children}</div>
      </main>
    </div>
  );
}
