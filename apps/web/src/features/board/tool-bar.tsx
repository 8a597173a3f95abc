import { Tooltip } from "../../ui/tooltip.tsx";
import { classNames } from "../../lib/class-names.ts";
import type { ToolName } from "./use-tool.ts";

const tools: readonly {
  readonly tool: ToolName;
  readonly label: string;
  readonly key: string;
  readonly path: string;
}[] = [
  { tool: "select", label: "Select", key: "V", path: "M6 3.500v13l3.500-3 2.200 4 2-1-2.200-4h4.500z" },
  { tool: "draw-run", label: "Run", key: "R", path: "M3 15l8-8M7 17l8-8M11 7l2-2M15 9l2-2" },
  { tool: "outlet", label: "Outlet", key: "O", path: "M4 4h12v12H4zM7 7h6v6H7zM4 4l12 12M16 4L4 16" },
  {
    tool: "equipment",
    label: "Equipment",
    key: "E",
    path: "M3 5h14v10H3zM10 7.500a2.500 2.500 0 1 1 0 5 2.500 2.500 0 0 1 0-5z",
  },
];

/** The tools of the board, each with its key. */
export function ToolBar({ tool, onChoose }: { tool: ToolName; onChoose: (tool: ToolName) => void }) {
  return (
    <div
      role="toolbar"
      aria-label="Tools"
      aria-orientation="vertical"
      className="absolute left-3 top-3 grid border border-b-float-line bg-b-float shadow-float"
    >
      {tools.map((each) => (
        <Tooltip key={each.tool} words={`${each.label} (${each.key})`}>
          <button
            type="button"
            aria-pressed={tool === each.tool}
            aria-label={each.label}
            className={classNames(
              "relative grid size-10 place-items-center border-b border-b-float-line text-b-float-ink last:border-b-0 hover:bg-b-duct-fill",
              tool === each.tool && "bg-b-duct-fill outline-2 -outline-offset-2 outline-scribe",
            )}
            onClick={() => onChoose(each.tool)}
          >
            <svg
              width={20}
              height={20}
              viewBox="0 0 20 20"
              aria-hidden
              className="fill-none stroke-current"
              strokeWidth={1.5}
            >
              <path d={each.path} />
            </svg>
            <span aria-hidden className="absolute bottom-0 right-0.5 text-2xs">
              {each.key}
            </span>
          </button>
        </Tooltip>
      ))}
    </div>
  );
}

export const TOOL_KEYS: Readonly<Record<string, ToolName>> = Object.fromEntries(
  tools.map(({ key, tool }) => [key.toLowerCase(), tool]),
);
