import type { QueryClient } from "@tanstack/react-query";
import { useQuery } from "@tanstack/react-query";
import { lazy, Suspense, useEffect, useState } from "react";
import { useSearchParams, type LoaderFunctionArgs } from "react-router-dom";
import { listOf } from "@cleatwork/layout";
import { GradeLineDock } from "../features/air/index.ts";
import { HEATS, type Heat } from "../features/board/index.ts";
import { Inspector } from "../features/inspector/index.ts";
import { LevelDialog, SystemChoice, SystemDialog, useChosenSystem } from "../features/systems/index.ts";
import { useWorkspace, useWorkspaceKeys, workspaceQueries } from "../features/workspace/index.ts";
import { companyParam, projectParam } from "../lib/route-params.ts";
import { Button } from "../ui/button.tsx";
import { SelectField } from "../ui/controls.tsx";
import { EmptyState } from "../ui/empty-state.tsx";
import { ScreenSkeleton } from "../ui/skeleton.tsx";
import { Toggle } from "../ui/toggle.tsx";

const BoardView = lazy(async () => ({ default: (await import("../features/board/index.ts")).BoardView }));
const ScheduleView = lazy(async () => ({ default: (await import("../features/schedule/index.ts")).ScheduleView }));

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) => {
    void client.prefetchQuery(workspaceQueries.drawings(companyParam(params), projectParam(params)));
    return null;
  };

/** The layout, as a plan or as a table: the same records, the same selection. */
export function Component() {
  const { layout, systems, mayEdit, company, project } = useWorkspace();
  const [search, setSearch] = useSearchParams();
  const { system, choose } = useChosenSystem();
  const { data: drawings } = useQuery(workspaceQueries.drawings(company.slug, project.id));
  const [dialog, setDialog] = useState<"system" | "new-system" | "level" | "new-level" | null>(null);
  useWorkspaceKeys();
  useSharedPlace(search.get("at"));

  const levels = listOf(layout, "level").sort((a, b) => a.elevation_m - b.elevation_m);
  const level = levels.find(({ id }) => id === search.get("level")) ?? levels[0] ?? null;
  const view = search.get("view") === "schedule" ? "schedule" : "board";
  const ground = search.get("ground") === "paper" ? "paper" : "dye";
  const heat = HEATS.find((each) => each === search.get("heat")) ?? "off";
  const put = (name: string, value: string) =>
    setSearch(
      (before) => {
        const after = new URLSearchParams(before);
        after.set(name, value);
        return after;
      },
      { replace: true },
    );

  return (
    <main className="flex min-h-0 min-w-0 grow flex-col">
      <h1 className="sr-only">Layout</h1>
      <div
        className="flex flex-wrap items-center gap-2 border-b border-line bg-sheet px-4 py-1.5"
        role="toolbar"
        aria-label="Layout"
      >
        <Toggle
          label="View"
          value={view}
          onChange={(next) => put("view", next)}
          choices={[
            { value: "board", label: "Board" },
            { value: "schedule", label: "Schedule" },
          ]}
        />
        {level && (
          <SelectField
            label="Level"
            hideLabel
            value={level.id}
            onChange={(event) => put("level", event.target.value)}
            choices={levels.map(({ id, name }) => ({ value: id, label: name }))}
          />
        )}
        {mayEdit && (
          <>
            <Button size="small" onClick={() => setDialog("level")}>
              Level, drawing
            </Button>
            <Button size="small" rank="bare" onClick={() => setDialog("new-level")}>
              + Level
            </Button>
          </>
        )}
        {system && <SystemChoice systems={systems} value={system.id} onChange={choose} />}
        {mayEdit && (
          <>
            {system && (
              <Button size="small" onClick={() => setDialog("system")}>
                System
              </Button>
            )}
            <Button size="small" rank={system ? "bare" : "primary"} onClick={() => setDialog("new-system")}>
              + System
            </Button>
          </>
        )}
        <span className="grow" />
        {view === "board" && (
          <>
            <Toggle<Heat>
              label="Heat"
              value={heat}
              onChange={(next) => put("heat", next)}
              choices={[
                { value: "off", label: "Heat off" },
                { value: "velocity", label: "Velocity" },
                { value: "friction", label: "Friction" },
              ]}
            />
            <Toggle
              label="Ground"
              value={ground}
              onChange={(next) => put("ground", next)}
              choices={[
                { value: "dye", label: "Dye" },
                { value: "paper", label: "Paper" },
              ]}
            />
          </>
        )}
      </div>
      <div className="flex min-h-0 min-w-0 grow">
        <div className="flex min-h-0 min-w-0 grow flex-col">
          <Suspense fallback={<ScreenSkeleton />}>
            {view === "schedule" ? (
              system ? (
                <ScheduleView key={system.id} systemId={system.id} />
              ) : (
                <EmptyState title="No air system yet">
                  Add a system: its equipment is where the first duct starts.
                </EmptyState>
              )
            ) : (
              level && (
                <BoardView
                  levelId={level.id}
                  systemId={system?.id ?? null}
                  ground={ground}
                  heat={heat}
                  drawings={drawings?.items ?? []}
                />
              )
            )}
          </Suspense>
          {view === "board" && system && (
            <div className="shrink-0 border-t border-line-strong bg-sheet max-md:hidden">
              <GradeLineDock systemId={system.id} />
            </div>
          )}
        </div>
        <Inspector />
      </div>
      {dialog === "new-system" && level && (
        <SystemDialog
          system={null}
          levelId={level.id}
          onClose={(id) => {
            setDialog(null);
            if (id) choose(id);
          }}
        />
      )}
      {dialog === "system" && system && level && (
        <SystemDialog system={system} levelId={level.id} onClose={() => setDialog(null)} />
      )}
      {(dialog === "level" || dialog === "new-level") && (
        <LevelDialog
          level={dialog === "level" ? level : null}
          drawings={drawings?.items ?? []}
          onClose={(id) => {
            setDialog(null);
            if (id) put("level", id);
          }}
        />
      )}
    </main>
  );
}

/** `?at=` names a duct or a node to go to: a link from a finding, or from a colleague. */
function useSharedPlace(at: string | null) {
  const { record, selection } = useWorkspace();
  const { select } = selection;
  const isThere = record(at) !== null;
  useEffect(() => {
    if (at !== null && isThere) select(at);
  }, [at, isThere, select]);
}
